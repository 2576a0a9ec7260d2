import { compensatedMean, compensatedSum } from './compensated-sum.js';

/** A fitted straight line y = intercept + slope·x with what the residuals say about it. */
export interface StraightLine {
  intercept: number;
  slope: number;
  interceptStdError: number;
  slopeStdError: number;
  /** Correlation of the estimated intercept and slope, −1 … 1. */
  correlation: number;
  /** √(Σe²/(n−2)). */
  residualStdDev: number;
  /** 1 − Σe²/Σ(y−ȳ)²; 1 when all y are equal (nothing is left to explain). */
  rSquared: number;
  degreesOfFreedom: number;
  /** The largest |e|. */
  largestResidual: number;
  count: number;
  /** Mean of x (weighted when the fit is). */
  meanX: number;
  /** Σ(x−x̄)² (weights scaled to a mean of 1 when the fit is weighted). */
  sxx: number;
  regressionSumOfSquares: number;
  residualSumOfSquares: number;
}

/**
 * Ordinary least squares of a straight line.
 *
 * Formula: b = Σ(x−x̄)(y−ȳ)/Σ(x−x̄)², a = ȳ − b·x̄, s² = Σe²/(n−2), s_b = s/√Sxx,
 * s_a = s·√(1/n + x̄²/Sxx), r(a,b) = −x̄/√(Sxx/n + x̄²). All sums are taken about the means and
 * compensated, so that a small slope on a large current keeps its digits.
 *
 * The points may come in any order. Throws a RangeError with fewer than three points, arrays of different
 * length, or x all equal.
 *
 * Source: any text on regression; checked against the certified values of the NIST Statistical Reference
 * Datasets (doi 10.18434/T43G6C). Cost: linear.
 *
 * @example fitLine([0, 1, 2, 3], [10, 9, 8, 7]).slope // -1
 */
export function fitLine(x: ArrayLike<number>, y: ArrayLike<number>): StraightLine {
  const n = x.length;
  if (n !== y.length) throw new RangeError('fitLine requires as many y as x');
  if (n < 3) throw new RangeError('fitLine requires at least three points');
  const meanX = compensatedMean(x);
  const meanY = compensatedMean(y);
  const dx = centred(x, meanX);
  const dy = centred(y, meanY);
  const sxx = sumOfProducts(dx, dx);
  if (!(sxx > 0)) throw new RangeError('fitLine requires at least two different x');
  const slope = sumOfProducts(dx, dy) / sxx;
  const residuals = residualsOf(dx, dy, slope);
  const residualSumOfSquares = sumOfProducts(residuals, residuals);
  const totalSumOfSquares = sumOfProducts(dy, dy);
  const residualStdDev = Math.sqrt(residualSumOfSquares / (n - 2));
  return {
    intercept: meanY - slope * meanX,
    slope,
    interceptStdError: residualStdDev * Math.sqrt(1 / n + (meanX * meanX) / sxx),
    slopeStdError: residualStdDev / Math.sqrt(sxx),
    correlation: -meanX / Math.sqrt(sxx / n + meanX * meanX),
    residualStdDev,
    rSquared: totalSumOfSquares > 0 ? 1 - residualSumOfSquares / totalSumOfSquares : 1,
    degreesOfFreedom: n - 2,
    largestResidual: largestMagnitude(residuals),
    count: n,
    meanX,
    sxx,
    regressionSumOfSquares: slope * slope * sxx,
    residualSumOfSquares,
  };
}

function centred(values: ArrayLike<number>, mean: number): Float64Array {
  const out = new Float64Array(values.length);
  for (let i = 0; i < out.length; i++) out[i] = values[i]! - mean;
  return out;
}

function residualsOf(dx: Float64Array, dy: Float64Array, slope: number): Float64Array {
  const out = new Float64Array(dx.length);
  for (let i = 0; i < out.length; i++) out[i] = dy[i]! - slope * dx[i]!;
  return out;
}

function sumOfProducts(a: Float64Array, b: Float64Array): number {
  const products = new Float64Array(a.length);
  for (let i = 0; i < a.length; i++) products[i] = a[i]! * b[i]!;
  return compensatedSum(products);
}

function largestMagnitude(values: Float64Array): number {
  let largest = 0;
  for (let i = 0; i < values.length; i++) largest = Math.max(largest, Math.abs(values[i]!));
  return largest;
}
