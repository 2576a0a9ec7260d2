import { compareAttempts, isCounted } from './counted-attempts.js';
import type { YieldCounts, YieldResult } from './yield.types.js';

export interface UnitContribution<Row extends YieldResult> {
  /** The attempt whose time and attributes place the unit in a period and a split. */
  first: Row;
  counts: YieldCounts;
}

/**
 * What one unit adds to the yield of one stage.
 *
 * A tally that keeps up with arrivals takes a unit's old contribution out and puts the new one in; since this
 * function depends on the set of results alone, any order of arrival leads to the same tally.
 *
 * @param results - everything known of one unit at one stage, in any order; a `resultId` that occurs twice
 *   counts once (the later in the list wins)
 * @param maxAttempts - largest number of attempts at the stage; Infinity when unlimited
 * @returns null when the unit has no counted attempt
 */
export function unitContribution<Row extends YieldResult>(
  results: readonly Row[],
  maxAttempts: number,
): UnitContribution<Row> | null {
  const known = new Map(results.map((result) => [result.resultId, result]));
  const attempts = [...known.values()].filter(isCounted).sort(compareAttempts);
  const first = attempts[0];
  const latest = attempts[attempts.length - 1];
  if (first === undefined || latest === undefined) return null;
  return {
    first,
    counts: {
      total: 1,
      firstPassed: Number(first.verdict === 'pass'),
      firstFailed: Number(first.verdict === 'fail'),
      firstNotProven: Number(first.verdict === 'notProven'),
      latestPassed: Number(latest.verdict === 'pass'),
      latestFailed: Number(latest.verdict === 'fail'),
      latestNotProven: Number(latest.verdict === 'notProven'),
      open: Number(latest.verdict !== 'pass' && attempts.length < maxAttempts),
    },
  };
}
