import type { SweepAnalysis } from '../analysis.types.js';
import { lineUncertainty } from './reference-current.js';

/** One place on a fitted line: its deviation from the reference current and the band of 95 % around it, in ppm. */
export interface SweepLinePoint {
  loadVolts: number;
  deviationPpm: number;
  lowPpm: number;
  highPpm: number;
}

/**
 * The fitted line with its uncertainty band over the fit range, for charts: deviation from the reference current
 * against load voltage.
 *
 * Formula: deviation = 10⁶·(a + b·V − I_ref)/I_ref, half-width = 10⁶·√(U_level² + (U·(V−V̄))²)/I_ref with U the
 * expanded uncertainty of the slope (rounding, gain and drift included) and U_level that of the line at V̄:
 * t·s/√n, or the rounding's half-width 0.6·δ where the rounding governs.
 *
 * @param count - number of equally spaced voltages, ends included
 * @returns empty when there is no fit, no slope uncertainty or no reference current
 */
export function sweepLine(analysis: SweepAnalysis, count = 25): SweepLinePoint[] {
  const { fit, slopeUncertainty, measures, points } = analysis;
  const referenceAmps = measures.find((measure) => measure.name === 'referenceCurrent')?.value ?? null;
  if (fit === null || slopeUncertainty === null || referenceAmps === null || !(referenceAmps > 0)) return [];
  const fittedVolts = points.filter((point) => point.inFit).map((point) => point.loadVolts);
  const low = Math.min(...fittedVolts);
  const step = (Math.max(...fittedVolts) - low) / (count - 1);
  const fromRounding = slopeUncertainty.fromResolution > 0 ? 0.6 * slopeUncertainty.resolutionAmps : 0;
  const level = Math.max(lineUncertainty(fit, fit.meanVolts), fromRounding);
  const ppmPerAmp = 1e6 / referenceAmps;
  return Array.from({ length: count }, (_, i) => {
    const loadVolts = low + i * step;
    const deviationPpm = (fit.interceptAmps + fit.slopeSiemens * loadVolts - referenceAmps) * ppmPerAmp;
    const half = Math.hypot(level, slopeUncertainty.expanded * (loadVolts - fit.meanVolts)) * ppmPerAmp;
    return { loadVolts, deviationPpm, lowPpm: deviationPpm - half, highPpm: deviationPpm + half };
  });
}
