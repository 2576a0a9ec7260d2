import { wilsonInterval } from './wilson-interval.js';

/** A yield as it is shown; the three fractions are null as long as there is no unit. */
export interface YieldShare {
  passed: number;
  total: number;
  share: number | null;
  low: number | null;
  high: number | null;
}

/**
 * A count of passed units as a share with its Wilson 95 % interval.
 *
 * @throws RangeError when the counts are not whole numbers with 0 ≤ passed ≤ total
 */
export function yieldShare(passed: number, total: number): YieldShare {
  const interval = wilsonInterval(passed, total);
  return {
    passed,
    total,
    share: total === 0 ? null : passed / total,
    low: interval?.low ?? null,
    high: interval?.high ?? null,
  };
}
