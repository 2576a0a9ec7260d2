import { betaQuantile } from '../distributions/beta.js';
import { requireCounts } from './counts.js';
import type { ShareInterval } from './wilson-interval.js';

/**
 * Clopper–Pearson ("exact") interval of a share, from quantiles of the beta distribution:
 *
 * `low = B(α/2; k, n−k+1)`, `high = B(1−α/2; k+1, n−k)`, with 0 and 1 at the ends.
 *
 * It covers at least as often as it says, hence is wider than Wilson's; for acceptance tests that must never
 * claim too much. With k = 0 its upper end is the closed form 1 − (α/2)^(1/n).
 *
 * @param passed - whole number, 0 to `total`
 * @param total - whole number; 0 gives null
 * @param confidence - two-sided; a one-sided 95 % limit is an end of the 90 % interval
 * @throws RangeError when the counts are not whole numbers with 0 ≤ passed ≤ total
 * @see C. J. Clopper, E. S. Pearson, Biometrika 26 (1934) 404; Newcombe (1998), method 5
 */
export function exactInterval(passed: number, total: number, confidence = 0.95): ShareInterval | null {
  requireCounts(passed, total, 'exactInterval');
  if (total === 0) return null;
  const tail = (1 - confidence) / 2;
  return {
    low: passed === 0 ? 0 : betaQuantile(tail, passed, total - passed + 1),
    high: passed === total ? 1 : betaQuantile(1 - tail, passed + 1, total - passed),
  };
}

/**
 * Largest share of failures that is compatible with no failure among n: one-sided, 1 − (1 − confidence)^(1/n).
 *
 * @param total - n ≥ 1
 * @param confidence - one-sided, default 0.95 (then about 3/n, the "rule of three")
 * @throws RangeError when n is not a whole number above 0
 * @example largestShareWithoutFailure(20) // 0.139
 */
export function largestShareWithoutFailure(total: number, confidence = 0.95): number {
  requireCounts(0, total, 'largestShareWithoutFailure');
  if (total === 0) throw new RangeError('largestShareWithoutFailure requires at least one unit');
  return -Math.expm1(Math.log1p(-confidence) / total);
}
