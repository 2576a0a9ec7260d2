import { useNow } from '@/lib/now';
import { useSite } from '@/lib/site';
import { formatTime, relativeTime, type TimeStyle } from '@/utils/format-time';

export interface TimeTextProps {
  /** UTC instant, ISO 8601. */
  at: string | null;
  /** `relative`: "3 min ago", the clock time as a title. `both`: "30 Nov, 08:15 (3 min ago)". */
  show?: TimeStyle | 'relative' | 'both';
  /** Said where there is no time. */
  none?: string;
}

/** An instant on the site's clock. */
export function TimeText({ at, show = 'short', none = '–' }: TimeTextProps) {
  const { timeZone } = useSite();
  const now = useNow();
  if (at === null) return <span>{none}</span>;
  const full = `${formatTime(at, timeZone, 'full')} (${timeZone})`;
  const since = relativeTime(at, now);
  const text =
    show === 'relative'
      ? since
      : show === 'both'
        ? `${formatTime(at, timeZone, 'short')} (${since})`
        : formatTime(at, timeZone, show);
  return (
    <time className="figures" dateTime={at} title={full}>
      {text}
    </time>
  );
}
