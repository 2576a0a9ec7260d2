import cdf from '@stdlib/stats-base-dists-t-cdf';
import quantile from '@stdlib/stats-base-dists-t-quantile';
import { requirePositive, requireProbability } from './arguments.js';
import { normalCdf, normalQuantile } from './normal.js';
import { cacheQuantile } from './quantile-cache.js';

const cachedQuantile = cacheQuantile((probability, degreesOfFreedom) =>
  quantile(probability, degreesOfFreedom),
);

/**
 * Distribution function of Student's t.
 *
 * @param t - dimensionless
 * @param degreesOfFreedom - ν > 0, whole or not; infinity gives the normal distribution
 * @throws RangeError when ν is not positive
 * @see Abramowitz & Stegun, 26.7
 */
export function tCdf(t: number, degreesOfFreedom: number): number {
  requirePositive(degreesOfFreedom, 'degrees of freedom', 'tCdf');
  return degreesOfFreedom === Infinity ? normalCdf(t) : cdf(t, degreesOfFreedom);
}

/**
 * Quantile of Student's t: the value that a t variable stays below with the given probability.
 *
 * Degrees of freedom need not be whole: GUM G.4.1 allows to interpolate between tabulated factors, and the
 * continuous distribution is that interpolation. Whoever wants the GUM's truncation applies it first.
 *
 * @param probability - 0 to 1, one-sided: 0.975 for a two-sided 95 % factor
 * @param degreesOfFreedom - ν > 0; infinity gives the normal quantile
 * @throws RangeError when the probability is outside [0, 1] or ν is not positive
 * @example tQuantile(0.975, 10) // 2.228…
 */
export function tQuantile(probability: number, degreesOfFreedom: number): number {
  requireProbability(probability, 'tQuantile');
  requirePositive(degreesOfFreedom, 'degrees of freedom', 'tQuantile');
  if (degreesOfFreedom === Infinity) return normalQuantile(probability);
  return cachedQuantile(probability, degreesOfFreedom);
}

/**
 * Two-sided coverage factor t_p(ν): a t variable lies within ±t_p with probability `confidence`.
 *
 * @param confidence - fraction, e.g. 0.95
 * @param degreesOfFreedom - ν > 0
 * @see JCGM 100:2008 (GUM), Table G.2
 * @example tFactor(0.95, 16) // 2.12
 */
export function tFactor(confidence: number, degreesOfFreedom: number): number {
  requireProbability(confidence, 'tFactor');
  return tQuantile(0.5 + confidence / 2, degreesOfFreedom);
}
