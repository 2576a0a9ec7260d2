/**
 * A reading is taken to be off by no more than 0.6·δ: half a step of ideal rounding and a fifth of that for
 * noise that tips it over.
 */
const HALF_WIDTH_IN_STEPS = 0.6;

export interface SlopeBounds {
  /** Steepest fall and rise (S) that all pairs of points allow when each current is off by at most 0.6·δ. */
  lowest: number;
  highest: number;
}

/**
 * Bounds of the slope from rounding alone.
 *
 * Rounding errors of one meter on a slowly changing current are not independent and do not average out, so they
 * are bounded, not spread: with h = 0.6·δ, over all pairs V_i < V_j,
 * lowest = max (I_j−I_i−2h)/(V_j−V_i), highest = min (I_j−I_i+2h)/(V_j−V_i).
 * When lowest exceeds highest, no line explains the readings by rounding: the scatter is larger than the steps.
 *
 * @param volts - ascending
 * @param amps - of the same length
 * @param sameVolts - pairs no further apart than this are skipped
 * @returns null when no pair is left. Cost: quadratic (500 points: 124,750 pairs).
 */
export function slopeBounds(
  volts: ArrayLike<number>,
  amps: ArrayLike<number>,
  resolutionAmps: number,
  sameVolts: number,
): SlopeBounds | null {
  const slack = 2 * HALF_WIDTH_IN_STEPS * resolutionAmps;
  let lowest = -Infinity;
  let highest = Infinity;
  for (let i = 0; i < volts.length; i++) {
    const fromVolts = volts[i]!;
    const fromAmps = amps[i]!;
    for (let j = i + 1; j < volts.length; j++) {
      const run = volts[j]! - fromVolts;
      if (run <= sameVolts) continue;
      const rise = amps[j]! - fromAmps;
      // Multiplied, not divided: a division per pair would double the cost of a long sweep.
      if (rise - slack > lowest * run) lowest = (rise - slack) / run;
      if (rise + slack < highest * run) highest = (rise + slack) / run;
    }
  }
  return lowest === -Infinity ? null : { lowest, highest };
}

/**
 * U_res: the distance from the fitted slope to the farther bound, or 0 when the bounds exclude each other (the
 * scatter exceeds the rounding and the standard error of the fit speaks alone).
 */
export function resolutionUncertainty(slope: number, bounds: SlopeBounds | null): number {
  if (bounds === null || bounds.lowest > bounds.highest) return 0;
  return Math.max(bounds.highest - slope, slope - bounds.lowest, 0);
}
