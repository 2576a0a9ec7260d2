import cdf from '@stdlib/stats-base-dists-chisquare-cdf';
import quantile from '@stdlib/stats-base-dists-chisquare-quantile';
import { requirePositive, requireProbability } from './arguments.js';
import { normalCdf, normalQuantile } from './normal.js';
import { cacheQuantile } from './quantile-cache.js';

/** Above this ν the library's upper tail loses its digits; the cube-root approximation is better there. */
const LARGEST_EXACT_DF = 1000;

const cachedQuantile = cacheQuantile((probability, degreesOfFreedom) =>
  quantile(probability, degreesOfFreedom),
);

/**
 * Distribution function of χ², the sum of ν squared standard normal variables.
 *
 * Above ν = 1000 the Wilson–Hilferty approximation is used: (χ²/ν)^⅓ is nearly normal with mean 1 − 2/(9ν)
 * and variance 2/(9ν). Its error there is below 3·10⁻⁵ in probability.
 *
 * @param chiSquare - χ² ≥ 0
 * @param degreesOfFreedom - ν > 0
 * @throws RangeError when ν is not positive
 * @see Abramowitz & Stegun, 26.4; Wilson & Hilferty, PNAS 17 (1931) 684
 */
export function chiSquareCdf(chiSquare: number, degreesOfFreedom: number): number {
  requirePositive(degreesOfFreedom, 'degrees of freedom', 'chiSquareCdf');
  if (degreesOfFreedom <= LARGEST_EXACT_DF) return cdf(chiSquare, degreesOfFreedom);
  if (chiSquare <= 0) return 0;
  const variance = 2 / (9 * degreesOfFreedom);
  return normalCdf((Math.cbrt(chiSquare / degreesOfFreedom) - (1 - variance)) / Math.sqrt(variance));
}

/**
 * Quantile of χ². Above ν = 1000 by Wilson–Hilferty, ν·(1 − 2/(9ν) + z·√(2/(9ν)))³, good to 5 digits.
 *
 * @param probability - 0 to 1
 * @param degreesOfFreedom - ν > 0
 * @throws RangeError on a probability outside [0, 1] or ν that is not positive
 * @example chiSquareQuantile(0.95, 9) // 16.918978
 */
export function chiSquareQuantile(probability: number, degreesOfFreedom: number): number {
  requireProbability(probability, 'chiSquareQuantile');
  requirePositive(degreesOfFreedom, 'degrees of freedom', 'chiSquareQuantile');
  if (degreesOfFreedom <= LARGEST_EXACT_DF) return cachedQuantile(probability, degreesOfFreedom);
  if (probability === 0) return 0;
  const variance = 2 / (9 * degreesOfFreedom);
  return degreesOfFreedom * (1 - variance + normalQuantile(probability) * Math.sqrt(variance)) ** 3;
}
