import { paths } from '@/config/paths';
import type { Cohort, Verdict, YieldBucket } from '@/types/api';
import { bucketDays } from './bucket-names';
import { filtersOf, type YieldQuery } from './yield-query';

export interface UnitsQuestion {
  verdict?: Verdict;
  failedMeasure?: string;
}

/** The units a figure counts: by the same first attempts, of the same days and filters. */
export function unitsLink(
  query: YieldQuery,
  { from, to }: { from: string; to: string },
  question: UnitsQuestion = {},
): string {
  return paths.units({ of: 'firstAttempt', from, to, ...filtersOf(query), ...question });
}

/** Where a point of the trend leads: to the units that pull it down, the more frequent kind; else to all of them. */
export function pointLink(query: YieldQuery, bucket: YieldBucket, timeZone: string): string {
  const verdict = worstVerdict(bucket);
  return unitsLink(query, bucketDays(bucket, timeZone), verdict ? { verdict } : {});
}

function worstVerdict({ failed, notProven }: Cohort): Verdict | null {
  if (failed === 0 && notProven === 0) return null;
  return failed >= notProven ? 'fail' : 'notProven';
}
