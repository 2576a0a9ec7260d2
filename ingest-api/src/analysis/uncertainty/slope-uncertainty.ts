import type { LineFit, SlopeUncertainty } from '../analysis.types.js';
import { tQuantile } from '../distributions/student-t.js';
import { resolutionUncertainty, slopeBounds, type SlopeBounds } from './resolution-bounds.js';

/** Load voltages, ascending, and the currents there. */
export interface SlopeReadings {
  volts: ArrayLike<number>;
  amps: ArrayLike<number>;
}

/** The readings are those of all fitted points. */
export interface SlopeEvidence extends SlopeReadings {
  fit: LineFit;
  /** The same by ammeter range when there are several: readings bound the slope within a range only. */
  ranges?: readonly SlopeReadings[];
  /** Voltages within this tolerance are one load step. */
  sameVolts: number;
  resolutionAmps: number;
  /** Specification limit of the ammeter's reading error; 0 when unknown. */
  readingAccuracyPercent: number;
  /** Change of the current at a repeated load voltage; null when nothing was repeated. */
  driftAmps: number | null;
}

/**
 * Expanded uncertainty (95 %) of the slope b = dI/dV of a sweep.
 *
 * Formula: U² = max(t(n−2, 0.975)·s_b, U_res)² + U_gain² + U_drift² with U_res from bounds on the rounding
 * (`slopeBounds`), U_gain = 2·|b|·reading%/√3 (a rectangular specification limit on the gain), and
 * U_drift = 2·|ΔI|/(L·√3) (the drift may tilt the line by up to ΔI over the span L). s_b already holds the
 * rounding that scatters: δ/√12 is never added to it. Identical readings give U = 1.2·δ/L whatever their number.
 *
 * Source: JCGM 100:2008 4.3.7 (rectangular limits), G.3 (t factor); the bounds were checked by simulation
 * (coverage in the proof of the computations).
 */
export function slopeUncertainty(evidence: SlopeEvidence): SlopeUncertainty {
  const { fit, volts, resolutionAmps } = evidence;
  const span = volts[volts.length - 1]! - volts[0]!;
  const fromScatter = tQuantile(0.975, fit.degreesOfFreedom) * fit.slopeStdError;
  const bounds = boundsOf(evidence);
  const fromResolution = resolutionUncertainty(fit.slopeSiemens, bounds);
  const fromGain = (2 * Math.abs(fit.slopeSiemens) * evidence.readingAccuracyPercent) / 100 / Math.sqrt(3);
  const fromDrift = (2 * Math.abs(evidence.driftAmps ?? 0)) / (span * Math.sqrt(3));
  return {
    expanded: Math.hypot(Math.max(fromScatter, fromResolution), fromGain, fromDrift),
    fromScatter,
    fromResolution,
    fromGain,
    fromDrift,
    resolutionAmps,
  };
}

/** The bounds that the ranges allow in common. */
function boundsOf({ volts, amps, ranges, sameVolts, resolutionAmps }: SlopeEvidence): SlopeBounds | null {
  if (ranges === undefined) return slopeBounds(volts, amps, resolutionAmps, sameVolts);
  const bounds = ranges.flatMap(
    (range) => slopeBounds(range.volts, range.amps, resolutionAmps, sameVolts) ?? [],
  );
  if (bounds.length === 0) return null;
  return {
    lowest: Math.max(...bounds.map(({ lowest }) => lowest)),
    highest: Math.min(...bounds.map(({ highest }) => highest)),
  };
}
