import type { Measure, PreparedPoint } from '../analysis.types.js';
import { absentMeasure, exactMeasure } from './measure.js';
import { differenceUncertainty, type SweepFindings } from './sweep-findings.js';

/**
 * `sweepHysteresis` (ppm): the largest difference between up and down readings at common load voltages, corrected
 * for the slope over what the voltages differ, over I_ref. `notMeasured` when no voltage was taken both ways.
 */
export function sweepHysteresis(findings: SweepFindings, relativeAmps: number | null): Measure {
  const largest = largestDifference(findings.usable, findings.sameVolts, findings.fit?.slopeSiemens ?? 0);
  if (largest === null) return absentMeasure('sweepHysteresis', 'notMeasured');
  if (relativeAmps === null) return absentMeasure('sweepHysteresis', 'notComputed: no current');
  const ppmPerAmp = 1e6 / relativeAmps;
  return exactMeasure('sweepHysteresis', largest * ppmPerAmp, differenceUncertainty(findings) * ppmPerAmp);
}

function largestDifference(
  ascending: readonly PreparedPoint[],
  sameVolts: number,
  slopeSiemens: number,
): number | null {
  let largest: number | null = null;
  for (let i = 0; i < ascending.length; i++) {
    const one = ascending[i]!;
    for (let j = i + 1; j < ascending.length; j++) {
      const other = ascending[j]!;
      const run = other.loadVolts - one.loadVolts;
      if (run > sameVolts) break;
      if (!areUpAndDown(one, other)) continue;
      largest = Math.max(largest ?? 0, Math.abs(other.outputAmps - one.outputAmps - slopeSiemens * run));
    }
  }
  return largest;
}

function areUpAndDown(a: PreparedPoint, b: PreparedPoint): boolean {
  return (a.direction === 'up' && b.direction === 'down') || (a.direction === 'down' && b.direction === 'up');
}
