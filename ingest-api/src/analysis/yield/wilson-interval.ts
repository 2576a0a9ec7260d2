import { normalQuantile } from '../distributions/normal.js';
import { requireCounts } from './counts.js';

export interface ShareInterval {
  low: number;
  high: number;
}

export interface WilsonOptions {
  /** Two-sided confidence, default 0.95; a one-sided 95 % limit is an end of the 90 % interval. */
  confidence?: number;
  /** Widen by half a count at each end (Newcombe's method 4); default false (method 3). */
  continuityCorrected?: boolean;
}

/**
 * Wilson score interval of a share, the interval behind every yield that is shown.
 *
 * It holds the shares π that a score test would not reject: with p = passed/total and z the normal quantile,
 *
 * `(p + z²/2n ± z·√(p(1−p)/n + z²/4n²)) / (1 + z²/n)`
 *
 * It never leaves [0, 1] and is honest for small lots and for none or all passed: 20 of 20 proves a yield of 84 %,
 * not of 100 %.
 *
 * @param passed - whole number, 0 to `total`
 * @param total - whole number; 0 gives null, for nothing is known then
 * @returns fractions from 0 to 1
 * @throws RangeError when the counts are not whole numbers with 0 ≤ passed ≤ total
 * @see E. B. Wilson, JASA 22 (1927) 209; R. G. Newcombe, Statistics in Medicine 17 (1998) 857, methods 3 and 4
 * @example wilsonInterval(81, 263) // { low: 0.2553, high: 0.3662 }
 */
export function wilsonInterval(
  passed: number,
  total: number,
  { confidence = 0.95, continuityCorrected = false }: WilsonOptions = {},
): ShareInterval | null {
  requireCounts(passed, total, 'wilsonInterval');
  if (total === 0) return null;
  const z = normalQuantile(0.5 + confidence / 2);
  if (continuityCorrected) {
    return {
      low: passed === 0 ? 0 : correctedLow(passed, total, z),
      high: passed === total ? 1 : 1 - correctedLow(total - passed, total, z),
    };
  }
  return { low: scoreLow(passed, total, z), high: 1 - scoreLow(total - passed, total, z) };
}

/** The upper end of a share is 1 minus the lower end of its complement, so only the lower end is written down. */
function scoreLow(passed: number, total: number, z: number): number {
  if (passed === 0) return 0;
  const share = passed / total;
  const spread = z * Math.sqrt((share * (1 - share)) / total + (z * z) / (4 * total * total));
  return Math.max(0, (share + (z * z) / (2 * total) - spread) / (1 + (z * z) / total));
}

function correctedLow(passed: number, total: number, z: number): number {
  const share = passed / total;
  const inner = z * z - 2 - 1 / total + 4 * share * (total * (1 - share) + 1);
  return Math.max(0, (2 * passed + z * z - 1 - z * Math.sqrt(inner)) / (2 * (total + z * z)));
}
