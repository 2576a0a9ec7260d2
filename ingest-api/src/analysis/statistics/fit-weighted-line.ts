import { compensatedSum } from './compensated-sum.js';
import type { StraightLine } from './fit-line.js';

/** A weighted line; the plain standard errors are scaled by √(χ²/ν), the unscaled ones trust the weights. */
export interface WeightedLine extends StraightLine {
  /** Σ(e/σ)²: near ν when the given standard deviations are true. */
  chiSquared: number;
  interceptStdErrorUnscaled: number;
  slopeStdErrorUnscaled: number;
}

/**
 * Least squares of a straight line whose points carry their own standard deviations of y.
 *
 * Formula: weights w = 1/σ², x̄ = Σwx/Σw, b = Σw(x−x̄)(y−ȳ)/Σw(x−x̄)². Two conventions of the standard errors
 * circulate: `slopeStdErrorUnscaled` = 1/√Σw(x−x̄)² holds when the σ are known in absolute terms;
 * `slopeStdError` is that times √(χ²/(n−2)) and needs only their ratios. `residualStdDev` and `sxx` are given
 * for weights scaled to a mean of 1, so that equal σ return exactly the unweighted fit.
 *
 * Throws a RangeError with fewer than three points, arrays of different length, a σ that is not a positive
 * number, or x all equal. Cost: linear.
 *
 * Source: P. R. Bevington, Data Reduction and Error Analysis, chapter on straight lines (from memory).
 */
export function fitWeightedLine(
  x: ArrayLike<number>,
  y: ArrayLike<number>,
  standardDeviations: ArrayLike<number>,
): WeightedLine {
  const n = x.length;
  if (n !== y.length || n !== standardDeviations.length) {
    throw new RangeError('fitWeightedLine requires as many y and standard deviations as x');
  }
  if (n < 3) throw new RangeError('fitWeightedLine requires at least three points');
  const { weights, meanWeight } = scaledWeights(standardDeviations);
  const sum = (term: (index: number) => number) =>
    compensatedSum(Float64Array.from(weights, (weight, i) => weight * term(i)));
  const meanX = sum((i) => x[i]!) / n;
  const meanY = sum((i) => y[i]!) / n;
  const sxx = sum((i) => (x[i]! - meanX) ** 2);
  if (!(sxx > 0)) throw new RangeError('fitWeightedLine requires at least two different x');
  const slope = sum((i) => (x[i]! - meanX) * (y[i]! - meanY)) / sxx;
  const residual = (i: number) => y[i]! - meanY - slope * (x[i]! - meanX);
  const residualSumOfSquares = sum((i) => residual(i) ** 2);
  const totalSumOfSquares = sum((i) => (y[i]! - meanY) ** 2);
  const residualStdDev = Math.sqrt(residualSumOfSquares / (n - 2));
  const interceptFactor = Math.sqrt(1 / n + (meanX * meanX) / sxx);
  const unscaled = 1 / Math.sqrt(meanWeight);
  return {
    intercept: meanY - slope * meanX,
    slope,
    interceptStdError: residualStdDev * interceptFactor,
    slopeStdError: residualStdDev / Math.sqrt(sxx),
    correlation: -meanX / Math.sqrt(sxx / n + meanX * meanX),
    residualStdDev,
    rSquared: totalSumOfSquares > 0 ? 1 - residualSumOfSquares / totalSumOfSquares : 1,
    degreesOfFreedom: n - 2,
    largestResidual: weights.reduce((largest, _, i) => Math.max(largest, Math.abs(residual(i))), 0),
    count: n,
    meanX,
    sxx,
    regressionSumOfSquares: slope * slope * sxx,
    residualSumOfSquares,
    chiSquared: residualSumOfSquares * meanWeight,
    interceptStdErrorUnscaled: unscaled * interceptFactor,
    slopeStdErrorUnscaled: unscaled / Math.sqrt(sxx),
  };
}

function scaledWeights(standardDeviations: ArrayLike<number>): { weights: Float64Array; meanWeight: number } {
  const weights = new Float64Array(standardDeviations.length);
  for (let i = 0; i < weights.length; i++) {
    const sigma = standardDeviations[i]!;
    if (!(sigma > 0)) throw new RangeError('fitWeightedLine requires positive standard deviations');
    weights[i] = 1 / (sigma * sigma);
  }
  const meanWeight = compensatedSum(weights) / weights.length;
  for (let i = 0; i < weights.length; i++) weights[i] = weights[i]! / meanWeight;
  return { weights, meanWeight };
}
