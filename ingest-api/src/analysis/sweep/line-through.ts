import type { LineFit, PreparedPoint } from '../analysis.types.js';
import { fitLine, type StraightLine } from '../statistics/fit-line.js';
import { fitWeightedLine } from '../statistics/fit-weighted-line.js';

/** Standard deviations further apart than this are mistakes, not weights. */
const LARGEST_WEIGHT_RATIO = 1e4;

/** Least squares through points of at least 3 voltages; `weighted`: by the standard deviations they carry. */
export function lineThrough(points: readonly PreparedPoint[], weighted: boolean): LineFit {
  const volts = points.map((point) => point.loadVolts);
  const amps = points.map((point) => point.outputAmps);
  const line = weighted
    ? fitWeightedLine(
        volts,
        amps,
        points.map((point) => point.outputAmpsStdDev ?? 1),
      )
    : fitLine(volts, amps);
  return inUnits(line, weighted);
}

/** Whether every point carries a standard deviation, and none is absurd beside the others. */
export function areWeights(points: readonly PreparedPoint[]): boolean {
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
