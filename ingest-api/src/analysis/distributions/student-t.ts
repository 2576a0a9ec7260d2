import gammaln from '@stdlib/math-base-special-gammaln';
import cdf from '@stdlib/stats-base-dists-t-cdf';
import quantile from '@stdlib/stats-base-dists-t-quantile';
import { requirePositive, requireProbability } from './arguments.js';
import { normalCdf, normalQuantile } from './normal.js';
import { cacheQuantile } from './quantile-cache.js';

/** Closer to the middle than this the library's quantile loses its digits, and is 0 in the end. */
const CENTRE = 1e-6;

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
  if (Math.abs(probability - 0.5) < CENTRE) return centralQuantile(probability - 0.5, degreesOfFreedom);
  return cachedQuantile(probability, degreesOfFreedom);
}

/** Two terms of the series about the middle, z + z³·(ν+1)/(6ν) with z = (p − ½)/f(0), f the density. */
function centralQuantile(aboveHalf: number, degreesOfFreedom: number): number {
  const nu = degreesOfFreedom;
  const densityAtZero = Math.exp(gammaln((nu + 1) / 2) - gammaln(nu / 2)) / Math.sqrt(nu * Math.PI);
  const z = aboveHalf / densityAtZero;
  return z + (z ** 3 * (nu + 1)) / (6 * nu);
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
