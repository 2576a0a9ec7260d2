import type { Measure } from '../analysis.types.js';
import { absentMeasure, boundMeasure, exactMeasure } from './measure.js';
import type { SweepFindings } from './sweep-findings.js';

/**
 * `linearityError` (ppm): the largest |residual| of the fit over I_ref.
 *
 * Its uncertainty is what rounding and noise can put there without any curvature: max(1.2·δ, 2·s₂), with s₂ the
 * scatter that line and quadratic leave over. A residual below that is only *at most* residual + U; `estimate`
 * keeps the residual itself.
 */
export function linearityError(findings: SweepFindings, relativeAmps: number | null): Measure {
  const { fit, curvature, slopeReason, resolutionAmps } = findings;
  if (fit === null) return absentMeasure('linearityError', slopeReason ?? 'notComputed');
  if (relativeAmps === null) return absentMeasure('linearityError', 'notComputed: no current');
  const ppmPerAmp = 1e6 / relativeAmps;
  const largest = fit.largestResidualAmps * ppmPerAmp;
  const uncertainty = Math.max(1.2 * resolutionAmps, 2 * (curvature?.scatterAmps ?? 0)) * ppmPerAmp;
  if (largest >= uncertainty) return exactMeasure('linearityError', largest, uncertainty);
  return {
    ...boundMeasure('linearityError', 'atMost', largest + uncertainty, uncertainty),
    low: 0,
    estimate: largest,
  };
}
