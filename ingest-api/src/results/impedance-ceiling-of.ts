import type { SweepAnalysis } from '../analysis/analysis.types.js';
import { impedanceCeiling } from '../analysis/uncertainty/impedance-ceiling.js';

/** The largest impedance that this very sweep could have proven, Ω; null when it can't be told. */
export function ceilingOf(analysis: SweepAnalysis): number | null {
  const resolutionAmps = analysis.slopeUncertainty?.resolutionAmps ?? 0;
  const loadVolts = analysis.points.filter((point) => point.inFit).map((point) => point.loadVolts);
  if (!(resolutionAmps > 0) || new Set(loadVolts).size < 3) return null;
  const scatterAmps = analysis.fit?.residualStdDev ?? 0;
  return impedanceCeiling({ loadVolts, resolutionAmps, scatterAmps }).ceilingOhms;
}
