const DAY_MS = 86_400_000;

/** The calendar day of an instant on the site's clock, `YYYY-MM-DD`. */
export function siteDay(instant: number, timeZone: string): string {
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).formatToParts(instant);
  const part = (type: string) => parts.find((candidate) => candidate.type === type)?.value ?? '';
  return `${part('year')}-${part('month')}-${part('day')}`;
}

/** The last `count` calendar days that end with `to`. A calendar day has no time zone, so whole days are subtracted. */
export function lastDays(count: number, to: string): { from: string; to: string } {
  const from = new Date(Date.parse(`${to}T00:00:00Z`) - (count - 1) * DAY_MS);
  return { from: Number.isNaN(from.getTime()) ? to : from.toISOString().slice(0, 10), to };
}
