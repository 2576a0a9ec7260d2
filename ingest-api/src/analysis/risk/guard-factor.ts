import { normalCdf, normalQuantile } from '../distributions/normal.js';

/**
 * Guard band, in standard uncertainties, that keeps the risk of a wrong pass at one limit below `risk`:
 * `w/u = Φ⁻¹(1 − risk)`. In expanded uncertainties (k = 2) it is half of that.
 *
 * @param risk - 0 to 1, e.g. 0.05 (w = 1.645·u = 0.8225·U, the usual choice of ISO 14253-1)
 * @throws RangeError when the risk is not from 0 to 1
 * @see JCGM 106:2012, 8.3.2; ISO 14253-1
 */
export function guardBandInStandardUncertainties(risk: number): number {
  return normalQuantile(1 - risk);
}

/**
 * Largest risk of a wrong pass that a guard factor leaves at one limit: `1 − Φ(factor·k)` with U = k·u, k = 2.
 *
 * @param guardFactor - w/U, 0 or more: 1 leaves 2.3 %, 0 leaves 50 %
 * @example riskOfGuardFactor(1) // 0.02275
 */
export function riskOfGuardFactor(guardFactor: number): number {
  return normalCdf(-2 * guardFactor);
}
