import { normalCdf } from '../distributions/normal.js';

/** The permissible values of a quantity: an open side is null. */
export interface ToleranceInterval {
  lower: number | null;
  upper: number | null;
}

/**
 * Probability that a measured quantity lies within its tolerance, given one measurement of it:
 *
 * `p = Φ((T_U − y)/u) − Φ((T_L − y)/u)`
 *
 * This is the specific (not the global) view: nothing is assumed about the production the unit came from,
 * and the quantity is taken as normally distributed about the measured value. The two terms are evaluated
 * on the side where they are small, so that probabilities near 0 and near 1 keep their digits.
 *
 * @param value - y, the measured value
 * @param standardUncertainty - u, same unit, ≥ 0 (0 gives 0 or 1; a value on the limit conforms)
 * @param tolerance - same unit; the limits belong to the tolerance
 * @throws RangeError when the standard uncertainty is negative or no number
 * @see JCGM 106:2012, clause 7
 * @example conformityProbability(9.8, 0.1, { lower: 9, upper: 10 }) // 0.97725
 */
export function conformityProbability(
  value: number,
  standardUncertainty: number,
  { lower, upper }: ToleranceInterval,
): number {
  if (!(standardUncertainty >= 0)) {
    throw new RangeError(
      `conformityProbability requires a standard uncertainty of 0 or more, got ${standardUncertainty}`,
    );
  }
  if (lower !== null && upper !== null && upper < lower) return 0;
  const zLower = standardised(lower, -Infinity, value, standardUncertainty);
  const zUpper = standardised(upper, Infinity, value, standardUncertainty);
  const between =
    zLower > 0 ? normalCdf(-zLower) - normalCdf(-zUpper) : normalCdf(zUpper) - normalCdf(zLower);
  return Math.min(1, Math.max(0, between));
}

function standardised(
  limit: number | null,
  open: number,
  value: number,
  standardUncertainty: number,
): number {
  if (limit === null) return open;
  const distance = limit - value;
  if (standardUncertainty > 0) return distance / standardUncertainty;
  if (distance === 0) return open;
  return distance > 0 ? Infinity : -Infinity;
}
