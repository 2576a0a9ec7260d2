import { compensatedMean, compensatedSum } from './compensated-sum.js';

export interface UnivariateSummary {
  count: number;
  mean: number;
  /** Divisor n − 1. */
  standardDeviation: number;
  /** Σ(yᵢ−ȳ)(yᵢ₊₁−ȳ)/Σ(yᵢ−ȳ)²; null when all values are equal. */
  lag1Autocorrelation: number | null;
}

/**
 * Mean, sample standard deviation (divisor n − 1) and lag-1 autocorrelation of numbers in their order.
 *
 * Two passes with compensated sums; what rounding of the mean leaves over is taken out again,
 * so that values like 10000000.2 keep the digits after the point. Throws a RangeError with fewer than two
 * values. Cost: linear.
 *
 * Source: definitions of the NIST StRD univariate sets (doi 10.18434/T43G6C).
 *
 * @example univariateSummary([1, 2, 3, 4]).standardDeviation // 1.2909944487358056
 */
export function univariateSummary(values: ArrayLike<number>): UnivariateSummary {
  const n = values.length;
  if (n < 2) throw new RangeError('standard deviation requires at least two values');
  const roughMean = compensatedMean(values);
  const rough = Float64Array.from({ length: n }, (_, i) => values[i]! - roughMean);
  const leftOver = compensatedSum(rough) / n;
  const deviations = rough.map((deviation) => deviation - leftOver);
  const squares = compensatedSum(deviations.map((deviation) => deviation * deviation));
  const lagged = compensatedSum(deviations.subarray(1).map((deviation, i) => deviation * deviations[i]!));
  return {
    count: n,
    mean: roughMean + leftOver,
    standardDeviation: Math.sqrt(squares / (n - 1)),
    lag1Autocorrelation: squares > 0 ? lagged / squares : null,
  };
}
