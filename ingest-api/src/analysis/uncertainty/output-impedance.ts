import type { OutputImpedance } from '../analysis.types.js';

/**
 * Output impedance from a slope and its expanded uncertainty.
 *
 * Formula: ĝ = −b; estimate 1/ĝ, interval [1/(ĝ+U), 1/(ĝ−U)]. When ĝ − U ≤ 0 the conductance cannot be told from
 * zero: there is no upper end, and the impedance is *at least* 1/(|ĝ|+U). U stays two-sided. When ĝ + U < 0 the
 * current rises significantly and there is no impedance: both ends are null, the estimate is negative.
 *
 * Nothing is infinite here: a slope of exactly zero has a null estimate, an end too large for a number is null.
 *
 * @param slopeSiemens - b = dI/dV in S
 * @param expandedSiemens - U in S, positive
 * @example outputImpedance(0, 1e-6).lowOhms // 1e6, bound 'atLeast'
 */
export function outputImpedance(slopeSiemens: number, expandedSiemens: number): OutputImpedance {
  const conductance = 0 - slopeSiemens;
  const rising = conductance + expandedSiemens < 0;
  const highOhms = conductance > expandedSiemens ? inverse(conductance - expandedSiemens) : null;
  return {
    estimateOhms: inverse(conductance),
    lowOhms: rising ? null : inverse(Math.abs(conductance) + expandedSiemens),
    highOhms,
    bound: rising || highOhms !== null ? 'exact' : 'atLeast',
    conductanceSiemens: conductance,
    expandedUncertaintySiemens: expandedSiemens,
  };
}

function inverse(conductance: number): number | null {
  const ohms = 1 / conductance;
  return Number.isFinite(ohms) ? ohms : null;
}
