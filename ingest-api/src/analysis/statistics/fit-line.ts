import { compensatedMean, CompensatedSum } from './compensated-sum.js';

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
  const { sxx, sxy, syy } = productsAbout(meanX, meanY, x, y);
  if (!(sxx > 0)) throw new RangeError('fitLine requires at least two different x');
  const slope = sxy / sxx;
  const { residualSumOfSquares, largestResidual } = residualsAbout(meanX, meanY, slope, x, y);
  const residualStdDev = Math.sqrt(residualSumOfSquares / (n - 2));
  return {
    intercept: meanY - slope * meanX,
    slope,
    interceptStdError: residualStdDev * Math.sqrt(1 / n + (meanX * meanX) / sxx),
    slopeStdError: residualStdDev / Math.sqrt(sxx),
    correlation: -meanX / Math.sqrt(sxx / n + meanX * meanX),
    residualStdDev,
    rSquared: syy > 0 ? 1 - residualSumOfSquares / syy : 1,
    degreesOfFreedom: n - 2,
    largestResidual,
    count: n,
    meanX,
    sxx,
    regressionSumOfSquares: slope * slope * sxx,
    residualSumOfSquares,
  };
}

function productsAbout(meanX: number, meanY: number, x: ArrayLike<number>, y: ArrayLike<number>) {
  const sxx = new CompensatedSum();
  const sxy = new CompensatedSum();
  const syy = new CompensatedSum();
  for (let i = 0; i < x.length; i++) {
    const dx = x[i]! - meanX;
    const dy = y[i]! - meanY;
    sxx.add(dx * dx);
    sxy.add(dx * dy);
    syy.add(dy * dy);
  }
  return { sxx: sxx.total, sxy: sxy.total, syy: syy.total };
}

function residualsAbout(
  meanX: number,
  meanY: number,
  slope: number,
  x: ArrayLike<number>,
  y: ArrayLike<number>,
) {
  const squares = new CompensatedSum();
  let largestResidual = 0;
  for (let i = 0; i < x.length; i++) {
    const residual = y[i]! - meanY - slope * (x[i]! - meanX);
    squares.add(residual * residual);
    largestResidual = Math.max(largestResidual, Math.abs(residual));
  }
  return { residualSumOfSquares: squares.total, largestResidual };
}
