import { fitSweep } from '../../analysis/sweep/fit-sweep.js';
import type { PreparedPoint } from '../../analysis/analysis.types.js';
import { slopeUncertainty } from '../../analysis/uncertainty/slope-uncertainty.js';
import type { SeededRandom } from './seeded-random.js';

/** A simulated bench in natural units: δ = 1 A-step, span L = 1 V, so slopes are in δ/L. */
export interface SimulatedBench {
  pointCount: number;
  /** σ/δ: normal noise before the meter rounds. */
  noise: number;
}

export interface MeasuredSlope {
  /** −dI/dV as fitted and its expanded uncertainty, in δ/L. */
  conductance: number;
  uncertainty: number;
}

/**
 * Measures a true straight line once: equal load steps over the span, a random phase of the meter's steps, normal
 * noise, rounding; then the very fit and slope uncertainty that results are judged by (no gain error, no drift).
 */
export function measureSlope(
  conductance: number,
  bench: SimulatedBench,
  random: SeededRandom,
): MeasuredSlope {
  const phase = random.uniform();
  const points: PreparedPoint[] = [];
  for (let index = 0; index < bench.pointCount; index++) {
    const loadVolts = index / (bench.pointCount - 1);
    const trueAmps = 1000 + phase - conductance * loadVolts;
    points.push(pointAt(index, loadVolts, Math.round(trueAmps + bench.noise * random.normal())));
  }
  const { fit } = fitSweep(points, 1e-3);
  if (fit === null) throw new RangeError('measureSlope requires at least three points');
  const { expanded } = slopeUncertainty({
    fit,
    volts: points.map((point) => point.loadVolts),
    amps: points.map((point) => point.outputAmps),
    sameVolts: 1e-3,
    resolutionAmps: 1,
    readingAccuracyPercent: 0,
    driftAmps: null,
  });
  return { conductance: 0 - fit.slopeSiemens, uncertainty: expanded };
}

/** A usable point of a simulated sweep. */
export function pointAt(index: number, loadVolts: number, outputAmps: number): PreparedPoint {
  return {
    index,
    loadVolts,
    outputAmps,
    direction: null,
    elapsedMs: null,
    outputAmpsStdDev: null,
    rangeAmps: null,
    overload: false,
    inFit: true,
    inRange: true,
  };
}
