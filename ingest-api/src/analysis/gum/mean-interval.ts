import { tFactor } from '../distributions/student-t.js';
import { univariateSummary } from '../statistics/univariate-summary.js';

export interface MeanInterval {
  mean: number;
  /** Two-sided Student factor at n − 1. */
  factor: number;
  low: number;
  high: number;
}

/**
 * Confidence interval of the mean of independent normal values: `ȳ ± t_{n−1}·s/√n`.
 *
 * @param values - at least two, any unit
 * @param confidence - two-sided, default 0.95
 * @throws RangeError with fewer than two values
 * @see NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.5.2
 */
export function meanInterval(values: ArrayLike<number>, confidence = 0.95): MeanInterval {
  const { count, mean, standardDeviation } = univariateSummary(values);
  const factor = tFactor(confidence, count - 1);
  const halfWidth = (factor * standardDeviation) / Math.sqrt(count);
  return { mean, factor, low: mean - halfWidth, high: mean + halfWidth };
}
