import { DateTime } from 'luxon';
import { InvalidError } from '../common/errors.js';
import type { BucketKind } from './dto/yield-query.dto.js';

/** A step of a trend: [startAt, endAt), epoch ms. */
export interface TimeBucket {
  startAt: number;
  endAt: number;
}

const MOST_BUCKETS = 2000;

/**
 * The steps from the beginning of one site day to the end of another. Days begin at the site's midnight, so a
 * day with a clock change has 23 or 25 hours; weeks begin on Monday (ISO 8601), the first is cut at `from`.
 * @throws InvalidError for a day that doesn't exist, an end before the beginning, or too many steps.
 */
export function timeBuckets(from: string, to: string, by: BucketKind, timeZone: string): TimeBucket[] {
  const start = siteDay(from, '/from', timeZone);
  const end = siteDay(to, '/to', timeZone).plus({ days: 1 });
  if (end <= start) throw new InvalidError([{ pointer: '/to', code: 'range', detail: 'Lies before from.' }]);
  const buckets: TimeBucket[] = [];
  let at = start;
  while (at < end) {
    const next = DateTime.min(stepAfter(at, by), end);
    buckets.push({ startAt: at.toMillis(), endAt: next.toMillis() });
    if (buckets.length > MOST_BUCKETS) {
      throw new InvalidError([
        { pointer: '/by', code: 'range', detail: `More than ${MOST_BUCKETS} steps; take wider ones.` },
      ]);
    }
    at = next;
  }
  return buckets;
}

/**
 * The time from the beginning of one site day to the end of another, either of them left open.
 * @throws InvalidError for a day that doesn't exist.
 */
export function sitePeriod(
  from: string | undefined,
  to: string | undefined,
  timeZone: string,
): { startedFrom?: number; startedBefore?: number } {
  return {
    ...(from !== undefined && { startedFrom: siteDay(from, '/from', timeZone).toMillis() }),
    ...(to !== undefined && { startedBefore: siteDay(to, '/to', timeZone).plus({ days: 1 }).toMillis() }),
  };
}

/** Hours are counted on the time line, so that the hour that a clock change doubles stands there twice. */
function stepAfter(at: DateTime, by: BucketKind): DateTime {
  return by === 'hour'
    ? at.plus({ hours: 1 })
    : at.startOf(by).plus(by === 'day' ? { days: 1 } : { weeks: 1 });
}

function siteDay(text: string, pointer: string, timeZone: string): DateTime {
  const day = DateTime.fromISO(text, { zone: timeZone });
  if (!day.isValid)
    throw new InvalidError([{ pointer, code: 'day', detail: `"${text}" is no day of the calendar.` }]);
  return day.startOf('day');
}
