import gammaln from '@stdlib/math-base-special-gammaln';
import { chiSquareCdf } from '../distributions/chi-square.js';
import { requirePositive } from '../distributions/arguments.js';
import { normalCdf, normalPdf } from '../distributions/normal.js';

/** What is known of a production before a unit is measured. */
export interface Prior {
  /** Density, in the reciprocal unit of the quantity. */
  density: (value: number) => number;
  /** Share of the production not above `value`. */
  cumulative: (value: number) => number;
  /** The interval outside of which the density is negligible (below 10⁻¹⁶ of the production). */
  support: { low: number; high: number };
}

/** Beyond this many standard deviations a normal density is negligible in double precision. */
const NEGLIGIBLE_SIGMAS = 9;

/**
 * A production that is normally distributed.
 *
 * @param mean - unit of the quantity
 * @param standardDeviation - same unit, > 0; of the units themselves, without the measurement's scatter
 * @throws RangeError when the standard deviation is not positive
 */
export function normalPrior(mean: number, standardDeviation: number): Prior {
  requirePositive(standardDeviation, 'a standard deviation', 'normalPrior');
  const reach = NEGLIGIBLE_SIGMAS * standardDeviation;
  return {
    density: (value) => normalPdf((value - mean) / standardDeviation) / standardDeviation,
    cumulative: (value) => normalCdf((value - mean) / standardDeviation),
    support: { low: mean - reach, high: mean + reach },
  };
}

/**
 * A production that is gamma distributed: for quantities that cannot be negative, such as a deviation from ideal.
 *
 * `f(x) = x^(k−1)·e^(−x/θ) / (Γ(k)·θ^k)`
 *
 * @param shape - k > 0
 * @param scale - θ > 0, unit of the quantity
 * @throws RangeError when a parameter is not positive
 */
export function gammaPrior(shape: number, scale: number): Prior {
  requirePositive(shape, 'a shape', 'gammaPrior');
  requirePositive(scale, 'a scale', 'gammaPrior');
  const logNorm = gammaln(shape) + shape * Math.log(scale);
  return {
    density: (value) => (value <= 0 ? 0 : Math.exp((shape - 1) * Math.log(value) - value / scale - logNorm)),
    // A gamma variable is θ/2 times a χ² variable with 2k degrees of freedom.
    cumulative: (value) => (value <= 0 ? 0 : chiSquareCdf((2 * value) / scale, 2 * shape)),
    support: { low: 0, high: scale * (shape + 12 * Math.sqrt(shape) + 40) },
  };
}
