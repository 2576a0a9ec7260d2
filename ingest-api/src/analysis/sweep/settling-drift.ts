import type { Measure } from '../analysis.types.js';
import { driftAmps } from './find-drift.js';
import { absentMeasure, exactMeasure } from './measure.js';
import { differenceUncertainty, type SweepFindings } from './sweep-findings.js';

/**
 * `settlingDrift` (ppm): change of the current from the first reading to its repetition at the end, corrected for
 * the slope over the small difference in voltage, over I_ref. Positive when the current rose.
 */
export function settlingDrift(findings: SweepFindings, relativeAmps: number | null): Measure {
  if (findings.repeated === null) return absentMeasure('settlingDrift', 'notMeasured');
  if (relativeAmps === null) return absentMeasure('settlingDrift', 'notComputed: no current');
  const drift = driftAmps(findings.repeated, findings.fit?.slopeSiemens ?? 0);
  const ppmPerAmp = 1e6 / relativeAmps;
  return exactMeasure('settlingDrift', drift * ppmPerAmp, differenceUncertainty(findings) * ppmPerAmp);
}
