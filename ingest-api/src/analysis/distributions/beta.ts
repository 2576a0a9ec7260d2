import cdf from '@stdlib/stats-base-dists-beta-cdf';
import quantile from '@stdlib/stats-base-dists-beta-quantile';
import { requirePositive, requireProbability } from './arguments.js';

/**
 * Distribution function of the beta distribution, the regularized incomplete beta function I_x(a, b).
 *
 * @param share - x in [0, 1]
 * @param alpha - a > 0
 * @param beta - b > 0
 * @throws RangeError when a parameter is not positive
 * @see Abramowitz & Stegun, 26.5
 */
export function betaCdf(share: number, alpha: number, beta: number): number {
  requirePositive(alpha, 'alpha', 'betaCdf');
  requirePositive(beta, 'beta', 'betaCdf');
  return cdf(share, alpha, beta);
}

/**
 * Quantile of the beta distribution.
 *
 * @param probability - 0 to 1
 * @param alpha - a > 0
 * @param beta - b > 0
 * @throws RangeError on a probability outside [0, 1] or a parameter that is not positive
 */
export function betaQuantile(probability: number, alpha: number, beta: number): number {
  requireProbability(probability, 'betaQuantile');
  requirePositive(alpha, 'alpha', 'betaQuantile');
  requirePositive(beta, 'beta', 'betaQuantile');
  return quantile(probability, alpha, beta);
}
