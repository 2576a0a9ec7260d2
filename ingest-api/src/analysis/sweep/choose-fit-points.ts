import type { PreparedPoint } from '../analysis.types.js';
import { countSteps } from './same-voltage.js';

/** Points taken on one ammeter range, by ascending voltage. */
export interface RangePoints {
  rangeAmps: number | null;
  points: PreparedPoint[];
}

export interface FitChoice {
  /** The main range first; each of their points is marked `inFit`. */
  ranges: RangePoints[];
  /** True when points on another ammeter range had to stay out. */
  rangeChanged: boolean;
}

/**
 * Chooses the points the straight line is fitted through: those in the promised range and below the knee.
 *
 * Another ammeter range has another gain and offset, so a step between ranges would pass for a slope. Each range
 * that holds two load steps or more gets its own intercept; the points of others are left out and flagged, and so
 * are all but those of the main range where too few steps are left to contradict a common slope. The main range is
 * the one with the most points, of two equal ones the larger.
 *
 * Marks the chosen points `inFit`.
 */
export function chooseFitPoints(
  usable: readonly PreparedPoint[],
  fitLimitVolts: number,
  sameVolts: number,
): FitChoice {
  const candidates = usable.filter((point) => point.inRange && point.loadVolts <= fitLimitVolts);
  const all = byRange(candidates);
  const ranges = all.length > 1 ? withOwnIntercepts(all, sameVolts) : all;
  let chosen = 0;
  for (const { points } of ranges) {
    for (const point of points) point.inFit = true;
    chosen += points.length;
  }
  return { ranges, rangeChanged: chosen < candidates.length };
}

function byRange(points: PreparedPoint[]): RangePoints[] {
  const first = points[0]?.rangeAmps ?? null;
  if (points.every((point) => point.rangeAmps === first)) return [{ rangeAmps: first, points }];
  const ranges = new Map<number | null, RangePoints>();
  for (const point of points) {
    const known = ranges.get(point.rangeAmps);
    if (known === undefined) ranges.set(point.rangeAmps, { rangeAmps: point.rangeAmps, points: [point] });
    else known.points.push(point);
  }
  return [...ranges.values()].sort(
    (a, b) => b.points.length - a.points.length || (b.rangeAmps ?? 0) - (a.rangeAmps ?? 0),
  );
}

/** A range's first step sets its intercept; a slope takes one step more, and a third can contradict it. */
function withOwnIntercepts(ranges: readonly RangePoints[], sameVolts: number): RangePoints[] {
  const furtherSteps = ({ points }: RangePoints) =>
    countSteps(
      points.map((point) => point.loadVolts),
      sameVolts,
    ) - 1;
  const sloped = ranges.filter((range) => furtherSteps(range) >= 1);
  const enough = sloped.reduce((sum, range) => sum + furtherSteps(range), 0) >= 2;
  return enough ? sloped : ranges.slice(0, 1);
}
