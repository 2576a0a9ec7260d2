import type { LineFit, PreparedPoint } from '../analysis.types.js';
import type { RangePoints } from './choose-fit-points.js';
import { lineThrough } from './line-through.js';

export interface RangesFit {
  fit: LineFit;
  /** What a range reads (A) above the main one at the same load voltage, by range. */
  offsetAmps: ReadonlyMap<number | null, number>;
  /** Distance between the mean voltages of the main range and the one farthest from it. */
  farthestVolts: number;
  /** The largest √(1/n₁ + 1/nₖ): scatter of the difference of two ranges' mean currents, in residual deviations. */
  meansLeverage: number;
}

/**
 * Fits one slope and an intercept for each ammeter range (analysis of covariance): another range has another gain
 * and offset, so a step between ranges must not pass for a slope.
 *
 * Formula: voltages and currents are centred within each range, then b = Σ(V−V̄ₖ)(I−Īₖ)/Σ(V−V̄ₖ)² over all of them,
 * aₖ = Īₖ − b·V̄ₖ, s² = Σe²/(n−K−1) with K ranges, s_b = s/√Σ(V−V̄ₖ)². The line returned is the main range's:
 * its `pointCount` and `meanVolts` are those of that range, which sets its level.
 *
 * @param ranges - the main one first; together at least K+2 load steps
 * @param weighted - whether the points' standard deviations are weights
 * @see N. R. Draper, H. Smith, Applied Regression Analysis, chapter on dummy variables (from memory)
 */
export function fitRanges(ranges: readonly RangePoints[], weighted: boolean): RangesFit {
  const means = ranges.map(({ points }) => meanOf(points, weighted));
  const centred = ranges.flatMap(({ points }, k) => points.map((point) => about(means[k]!, point)));
  const line = lineThrough(centred, weighted);
  const degreesOfFreedom = line.degreesOfFreedom - (ranges.length - 1);
  const widening = Math.sqrt(line.degreesOfFreedom / degreesOfFreedom);
  const main = means[0]!;
  const pointsPerWeight = line.pointCount / sum(means.map(({ weight }) => weight));
  const level = pointsPerWeight * main.weight;
  const levelVariance = 1 / level + main.loadVolts ** 2 / line.sxx;
  const residualStdDev = line.residualStdDev * widening;
  const interceptOf = (mean: Mean) => mean.outputAmps - line.slopeSiemens * mean.loadVolts;
  return {
    fit: {
      ...line,
      interceptAmps: interceptOf(main),
      interceptStdError: residualStdDev * Math.sqrt(levelVariance),
      slopeStdError: line.slopeStdError * widening,
      correlation: -main.loadVolts / Math.sqrt(line.sxx * levelVariance),
      residualStdDev,
      degreesOfFreedom,
      pointCount: level,
      meanVolts: main.loadVolts,
    },
    offsetAmps: new Map(
      ranges.map(({ rangeAmps }, k) => [rangeAmps, interceptOf(means[k]!) - interceptOf(main)]),
    ),
    farthestVolts: Math.max(...means.map((mean) => Math.abs(mean.loadVolts - main.loadVolts))),
    meansLeverage: Math.sqrt(
      Math.max(0, ...means.slice(1).map(({ weight }) => 1 / level + 1 / (pointsPerWeight * weight))),
    ),
  };
}

interface Mean {
  loadVolts: number;
  outputAmps: number;
  weight: number;
}

function meanOf(points: readonly PreparedPoint[], weighted: boolean): Mean {
  const weights = points.map((point) => (weighted ? (point.outputAmpsStdDev ?? 1) ** -2 : 1));
  const weight = sum(weights);
  const mean = (reading: (point: PreparedPoint) => number) =>
    sum(points.map((point, i) => (weights[i]! / weight) * reading(point)));
  return {
    loadVolts: mean((point) => point.loadVolts),
    outputAmps: mean((point) => point.outputAmps),
    weight,
  };
}

function about(mean: Mean, point: PreparedPoint): PreparedPoint {
  return {
    ...point,
    loadVolts: point.loadVolts - mean.loadVolts,
    outputAmps: point.outputAmps - mean.outputAmps,
  };
}

function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, number) => total + number, 0);
}
