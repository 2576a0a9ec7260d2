import cdf from '@stdlib/stats-base-dists-normal-cdf';
import quantile from '@stdlib/stats-base-dists-normal-quantile';
import { requireProbability } from './arguments.js';

/**
 * Distribution function of the standard normal distribution, Φ(z) = ½·erfc(−z/√2).
 *
 * @param z - dimensionless; infinities give 0 and 1
 * @returns the probability of a value not above `z`
 * @see Abramowitz & Stegun, Handbook of Mathematical Functions, 26.2
 */
export function normalCdf(z: number): number {
  return cdf(z, 0, 1);
}

/**
 * Density of the standard normal distribution, φ(z) = exp(−z²/2)/√(2π).
 */
export function normalPdf(z: number): number {
  return Math.exp(-0.5 * z * z) / Math.sqrt(2 * Math.PI);
}

/** Below this the library's quantile holds fewer digits than its distribution function: two steps of Newton mend it. */
const FAR_TAIL = 1e-3;

/**
 * Quantile of the standard normal distribution, Φ⁻¹(p). About 13 digits down to p = 10⁻¹².
 *
 * @param probability - 0 to 1; the ends give ∓infinity
 * @throws RangeError outside [0, 1]
 */
export function normalQuantile(probability: number): number {
  requireProbability(probability, 'normalQuantile');
  const rough = quantile(probability, 0, 1);
  if (probability === 0 || probability > FAR_TAIL) return rough;
  return newtonStep(newtonStep(rough, probability), probability);
}

function newtonStep(z: number, probability: number): number {
  return z - (normalCdf(z) - probability) / normalPdf(z);
}
