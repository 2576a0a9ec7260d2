import { tQuantile } from '../distributions/student-t.js';

/** Below this share of δ the scatter does not dither the rounding away. */
const SCATTER_IN_STEPS = 0.4;

export interface CeilingConditions {
  /** The plan's load steps, at least 3 different ones. */
  loadVolts: readonly number[];
  /** δ of the station's ammeter on the range used. */
  resolutionAmps: number;
  /** σ: pooled residual scatter of the station; 0 when unknown. */
  scatterAmps: number;
}

export interface ImpedanceCeiling {
  /** Largest impedance this station and plan can tell from an ideal source. */
  ceilingOhms: number;
  /** G₀ = 1/ceiling. */
  conductanceSiemens: number;
  /** What sets it: the meter's steps (mend by range or meter) or the scatter (mend by more steps, settling). */
  governedBy: 'resolution' | 'scatter';
}

/**
 * The largest impedance a station can prove with a test plan.
 *
 * Formula: ceiling = 1/G₀, G₀ = max(1.2·δ/L if σ < 0.4·δ, t(n−2, 0.975)·√(σ²+δ²/12)/√Sxx), with L the span of
 * the load voltages and Sxx = Σ(V−V̄)².
 *
 * Throws a RangeError with fewer than 3 load steps, steps all equal, or a resolution that is not positive.
 */
export function impedanceCeiling({
  loadVolts,
  resolutionAmps,
  scatterAmps,
}: CeilingConditions): ImpedanceCeiling {
  const n = loadVolts.length;
  if (n < 3) throw new RangeError('impedanceCeiling requires at least three load steps');
  if (!(resolutionAmps > 0)) throw new RangeError('impedanceCeiling requires a positive resolution');
  const mean = loadVolts.reduce((sum, volts) => sum + volts, 0) / n;
  const sxx = loadVolts.reduce((sum, volts) => sum + (volts - mean) ** 2, 0);
  if (!(sxx > 0)) throw new RangeError('impedanceCeiling requires different load voltages');
  const span = Math.max(...loadVolts) - Math.min(...loadVolts);
  const byResolution = scatterAmps < SCATTER_IN_STEPS * resolutionAmps ? (1.2 * resolutionAmps) / span : 0;
  const byScatter = tQuantile(0.975, n - 2) * Math.sqrt((scatterAmps ** 2 + resolutionAmps ** 2 / 12) / sxx);
  const conductanceSiemens = Math.max(byResolution, byScatter);
  return {
    ceilingOhms: 1 / conductanceSiemens,
    conductanceSiemens,
    governedBy: byResolution >= byScatter ? 'resolution' : 'scatter',
  };
}

export type LimitProvability = 'provable' | 'aboveHalfCeiling' | 'aboveCeiling';

/** Whether a lower impedance limit can be proven: warned about above half the ceiling, not at all above it. */
export function limitProvability(limitOhms: number, ceiling: ImpedanceCeiling): LimitProvability {
  if (limitOhms > ceiling.ceilingOhms) return 'aboveCeiling';
  return limitOhms > ceiling.ceilingOhms / 2 ? 'aboveHalfCeiling' : 'provable';
}
