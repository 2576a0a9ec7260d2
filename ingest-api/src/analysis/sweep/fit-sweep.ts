import type { LineFit, PreparedPoint } from '../analysis.types.js';
import { fitLine, type StraightLine } from '../statistics/fit-line.js';
import { fitWeightedLine } from '../statistics/fit-weighted-line.js';
import { countSteps } from './same-voltage.js';

/** Two load steps always lie on a line; the third can contradict it. */
const FEWEST_STEPS = 3;

/** Standard deviations further apart than this are mistakes, not weights. */
const LARGEST_WEIGHT_RATIO = 1e4;

export interface SweepFit {
  fit: LineFit | null;
  /** Load steps (different voltages) among the fitted points. */
  steps: number;
  /** Some points carry a standard deviation and others none, or one of zero: no weights were used. */
  weightsUnused: boolean;
}

/**
 * Fits I = a + b·V through the chosen points: ordinary least squares, or weighted when *every* point carries its
 * own standard deviation (> 0, none over 10,000 times another). Standard errors of a weighted fit are those from the residuals (scaled by
 * √(χ²/ν)), so that both kinds take the same t factor.
 *
 * @param points - by ascending voltage
 * @param sameVolts - voltages within this tolerance are one load step
 * @returns fit null with fewer than 3 load steps
 */
export function fitSweep(points: readonly PreparedPoint[], sameVolts: number): SweepFit {
  const volts = points.map((point) => point.loadVolts);
  const steps = countSteps(volts, sameVolts);
  const weighted = areWeights(points);
  const weightsUnused = !weighted && points.some((point) => point.outputAmpsStdDev !== null);
  if (steps < FEWEST_STEPS) return { fit: null, steps, weightsUnused };
  const amps = points.map((point) => point.outputAmps);
  const line = weighted
    ? fitWeightedLine(
        volts,
        amps,
        points.map((point) => point.outputAmpsStdDev ?? 1),
      )
    : fitLine(volts, amps);
  return { fit: inUnits(line, weighted), steps, weightsUnused };
}

/** Whether every point carries a standard deviation, and none is absurd beside the others. */
function areWeights(points: readonly PreparedPoint[]): boolean {
  const deviations = points.map((point) => point.outputAmpsStdDev ?? 0);
  const smallest = Math.min(...deviations);
  return points.length > 0 && smallest > 0 && Math.max(...deviations) <= LARGEST_WEIGHT_RATIO * smallest;
}

function inUnits(line: StraightLine, weighted: boolean): LineFit {
  return {
    interceptAmps: line.intercept,
    slopeSiemens: line.slope,
    interceptStdError: line.interceptStdError,
    slopeStdError: line.slopeStdError,
    correlation: line.correlation,
    residualStdDev: line.residualStdDev,
    rSquared: line.rSquared,
    degreesOfFreedom: line.degreesOfFreedom,
    largestResidualAmps: line.largestResidual,
    pointCount: line.count,
    meanVolts: line.meanX,
    sxx: line.sxx,
    weighted,
  };
}
