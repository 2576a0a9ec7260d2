const STYLES = {
  /** 30 Nov 2026, 08:15:30 */
  full: {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    second: '2-digit',
  },
  /** 30 Nov, 08:15 */
  short: { day: 'numeric', month: 'short', hour: '2-digit', minute: '2-digit' },
  /** 08:15:30 */
  clock: { hour: '2-digit', minute: '2-digit', second: '2-digit' },
  /** 30 Nov 2026 */
  date: { day: 'numeric', month: 'short', year: 'numeric' },
} satisfies Record<string, Intl.DateTimeFormatOptions>;

export type TimeStyle = keyof typeof STYLES;

const formatters = new Map<string, Intl.DateTimeFormat>();

function formatter(timeZone: string, style: TimeStyle): Intl.DateTimeFormat {
  const key = `${timeZone} ${style}`;
  let found = formatters.get(key);
  if (!found) {
    found = new Intl.DateTimeFormat('en-GB', { ...STYLES[style], timeZone, hourCycle: 'h23' });
    formatters.set(key, found);
  }
  return found;
}

/** A UTC instant as read on the site's clock. */
export function formatTime(iso: string, timeZone: string, style: TimeStyle = 'full'): string {
  return formatter(timeZone, style).format(new Date(iso));
}

/** A calendar day `YYYY-MM-DD`, which has no time zone: Monday 30 November 2026. */
export function formatDay(day: string): string {
  return new Intl.DateTimeFormat('en-GB', { dateStyle: 'full', timeZone: 'UTC' }).format(
    new Date(`${day}T00:00:00Z`),
  );
}

const relative = new Intl.RelativeTimeFormat('en-GB', { numeric: 'auto', style: 'short' });
const STEPS: [unit: Intl.RelativeTimeFormatUnit, seconds: number, upTo: number][] = [
  ['second', 1, 60],
  ['minute', 60, 60 * 60],
  ['hour', 3600, 24 * 3600],
  ['day', 86_400, 14 * 86_400],
  ['week', 604_800, 60 * 86_400],
  ['month', 2_629_800, Infinity],
];

/** Time since an instant in words: "now", "40 sec ago", "3 min ago", "yesterday". */
export function relativeTime(iso: string, now: number): string {
  const seconds = (Date.parse(iso) - now) / 1000;
  if (Math.abs(seconds) < 10) return 'now';
  const [unit, length] = STEPS.find(([, , upTo]) => Math.abs(seconds) < upTo) ?? ['month', 2_629_800];
  return relative.format(Math.trunc(seconds / length), unit);
}
