import { tFactor } from '../distributions/student-t.js';

/**
 * Whole degrees of freedom for a table look-up: ν_eff as printed to one decimal, then cut to the next lower
 * integer, as the GUM does it (H.1: 16.7 → 16; G.4.1: 18.9987, printed 19.0 → 19). Infinity stays infinite.
 *
 * @throws RangeError when ν is below 1 even then: there is no factor to speak of
 * @see JCGM 100:2008 (GUM), G.4.1, note 1
 */
export function wholeDegreesOfFreedom(effective: number): number {
  const whole = Math.floor(Math.round(effective * 10) / 10);
  if (!(whole >= 1)) throw new RangeError(`degrees of freedom must be 1 or more, got ${effective}`);
  return whole;
}

/**
 * Expanded uncertainty `U = t_p(ν)·u_c`, so that ±U covers the fraction `confidence`.
 *
 * ν is used as given, whole or not: truncate it first where the GUM's table is to be reproduced.
 *
 * @param standardUncertainty - u_c ≥ 0
 * @param degreesOfFreedom - ν > 0; Infinity gives the normal factor (1.96 for 95 %)
 * @param confidence - e.g. 0.95
 * @see JCGM 100:2008 (GUM), G.3.2
 */
export function expandedUncertainty(
  standardUncertainty: number,
  degreesOfFreedom: number,
  confidence = 0.95,
): number {
  return tFactor(confidence, degreesOfFreedom) * standardUncertainty;
}
