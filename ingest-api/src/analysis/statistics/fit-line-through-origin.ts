import { compensatedSum } from './compensated-sum.js';

/** A fitted line y = slope·x. */
export interface LineThroughOrigin {
  slope: number;
  slopeStdError: number;
  /** √(Σe²/(n−1)). */
  residualStdDev: number;
  /** About zero, not about the mean: 1 − Σe²/Σy². */
  rSquared: number;
  degreesOfFreedom: number;
  count: number;
  regressionSumOfSquares: number;
  residualSumOfSquares: number;
}

/**
 * Least squares of a line that must pass through the origin.
 *
 * Formula: b = Σxy/Σx², s² = Σe²/(n−1), s_b = s/√Σx². R² is the one about zero (as the NIST sets NoInt1 and
 * NoInt2 certify it); it cannot be compared with the R² of a line that has an intercept.
 *
 * Throws a RangeError with fewer than two points, arrays of different length, or x all zero. Cost: linear.
 *
 * @example fitLineThroughOrigin([1, 2, 3], [2, 4, 6]).slope // 2
 */
export function fitLineThroughOrigin(x: ArrayLike<number>, y: ArrayLike<number>): LineThroughOrigin {
  const n = x.length;
  if (n !== y.length) throw new RangeError('fitLineThroughOrigin requires as many y as x');
  if (n < 2) throw new RangeError('fitLineThroughOrigin requires at least two points');
  const sumXX = sumOf(n, (i) => x[i]! * x[i]!);
  if (!(sumXX > 0)) throw new RangeError('fitLineThroughOrigin requires an x that is not zero');
  const slope = sumOf(n, (i) => x[i]! * y[i]!) / sumXX;
  const residualSumOfSquares = sumOf(n, (i) => (y[i]! - slope * x[i]!) ** 2);
  const sumYY = sumOf(n, (i) => y[i]! * y[i]!);
  const residualStdDev = Math.sqrt(residualSumOfSquares / (n - 1));
  return {
    slope,
    slopeStdError: residualStdDev / Math.sqrt(sumXX),
    residualStdDev,
    rSquared: sumYY > 0 ? 1 - residualSumOfSquares / sumYY : 1,
    degreesOfFreedom: n - 1,
    count: n,
    regressionSumOfSquares: slope * slope * sumXX,
    residualSumOfSquares,
  };
}

function sumOf(count: number, term: (index: number) => number): number {
  return compensatedSum(Float64Array.from({ length: count }, (_, i) => term(i)));
}
