import type { YieldBucket } from '@/types/api';
import { siteDay } from './site-days';
import type { Step } from './yield-query';

const forms = {
  day: { day: 'numeric', month: 'short' },
  weekday: { weekday: 'short', day: 'numeric', month: 'short' },
  hour: { day: 'numeric', month: 'short', hour: '2-digit', minute: '2-digit' },
} satisfies Record<string, Intl.DateTimeFormatOptions>;

const format = (iso: string, timeZone: string, form: keyof typeof forms): string =>
  new Intl.DateTimeFormat('en-GB', { ...forms[form], timeZone, hourCycle: 'h23' }).format(new Date(iso));

type Times = Pick<YieldBucket, 'startAt' | 'endAt'>;

/** Short name of a step below the chart: "30 Nov", "30 Nov, 08:00". */
export function bucketTick({ startAt }: Times, by: Step, timeZone: string): string {
  return format(startAt, timeZone, by === 'hour' ? 'hour' : 'day');
}

/** Name of a step in a table: "Mon, 30 Nov", "30 Nov, 08:00", "23 Nov to 29 Nov". */
export function bucketName(bucket: Times, by: Step, timeZone: string): string {
  if (by === 'hour') return format(bucket.startAt, timeZone, 'hour');
  if (by === 'day') return format(bucket.startAt, timeZone, 'weekday');
  return `${format(bucket.startAt, timeZone, 'day')} to ${format(lastInstant(bucket), timeZone, 'day')}`;
}

/** First and last site day of a step. */
export function bucketDays(bucket: Times, timeZone: string): { from: string; to: string } {
  return {
    from: siteDay(Date.parse(bucket.startAt), timeZone),
    to: siteDay(Date.parse(lastInstant(bucket)), timeZone),
  };
}

const lastInstant = ({ endAt }: Times): string => new Date(Date.parse(endAt) - 1).toISOString();
