import type {
  LineFit,
  OutputImpedance,
  PreparedPoint,
  SlopeUncertainty,
  SweepInput,
} from '../analysis.types.js';
import { tQuantile } from '../distributions/student-t.js';
import type { RangePoints } from './choose-fit-points.js';
import type { Curvature } from './curvature.js';
import type { ComplianceSearch } from './find-compliance.js';
import type { RepeatedPoint } from './find-drift.js';

/** What the steps of the analysis found out about one sweep: all that the measures are made of. */
export interface SweepFindings {
  input: SweepInput;
  /** Points that carry a reading, by ascending voltage, at the level of the main ammeter range. */
  usable: readonly PreparedPoint[];
  /** Those the line was fitted through. */
  fitted: readonly PreparedPoint[];
  /** The fitted points as read, by ammeter range, the main one first. */
  ranges: readonly RangePoints[];
  /** Expanded uncertainty (A) of the level of one ammeter range against another; 0 with one range. */
  levelAmps: number;
  compliance: ComplianceSearch;
  fit: LineFit | null;
  curvature: Curvature | null;
  /** Why the slope measures have no value; null when they have. */
  slopeReason: string | null;
  slopeUncertainty: SlopeUncertainty | null;
  impedance: OutputImpedance | null;
  repeated: RepeatedPoint | null;
  resolutionAmps: number;
  /** Voltages within this tolerance are one load step; points this far beyond an end still stand for it. */
  sameVolts: number;
  endVolts: number;
}

/**
 * Expanded uncertainty (A) of the difference of two readings: both roundings by bounds (1.2·δ) or the scatter
 * about the line, t·s·√2, whichever is larger, and the level between ammeter ranges where there are several. What
 * the meter's gain adds cancels in a difference.
 */
export function differenceUncertainty({ fit, resolutionAmps, levelAmps }: SweepFindings): number {
  const scatter = fit === null ? 0 : tQuantile(0.975, fit.degreesOfFreedom) * fit.residualStdDev * Math.SQRT2;
  const fromReadings = Math.max(1.2 * resolutionAmps, scatter);
  return levelAmps === 0 ? fromReadings : Math.hypot(fromReadings, levelAmps);
}
