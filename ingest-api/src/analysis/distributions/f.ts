import cdf from '@stdlib/stats-base-dists-f-cdf';
import quantile from '@stdlib/stats-base-dists-f-quantile';
import { requirePositive, requireProbability } from './arguments.js';

/**
 * Distribution function of Fisher's F, the ratio of two independent variance estimates of equal expectation.
 *
 * @param ratio - F ≥ 0
 * @param numeratorDf - ν₁ > 0
 * @param denominatorDf - ν₂ > 0
 * @throws RangeError when a number of degrees of freedom is not positive
 * @see Abramowitz & Stegun, 26.6
 */
export function fCdf(ratio: number, numeratorDf: number, denominatorDf: number): number {
  requirePositive(numeratorDf, 'degrees of freedom', 'fCdf');
  requirePositive(denominatorDf, 'degrees of freedom', 'fCdf');
  return cdf(ratio, numeratorDf, denominatorDf);
}

/**
 * Quantile of Fisher's F.
 *
 * @param probability - 0 to 1, e.g. 0.95 for the usual critical value
 * @throws RangeError on a probability outside [0, 1] or degrees of freedom that are not positive
 * @example fQuantile(0.95, 9, 40) // 2.124…
 */
export function fQuantile(probability: number, numeratorDf: number, denominatorDf: number): number {
  requireProbability(probability, 'fQuantile');
  requirePositive(numeratorDf, 'degrees of freedom', 'fQuantile');
  requirePositive(denominatorDf, 'degrees of freedom', 'fQuantile');
  return quantile(probability, numeratorDf, denominatorDf);
}
