import type { PreparedPoint, SweepInput } from '../analysis.types.js';

export interface FitChoice {
  /** By ascending voltage; each is marked `inFit`. */
  points: PreparedPoint[];
  /** True when points on another ammeter range had to stay out. */
  rangeChanged: boolean;
}

/**
 * Chooses the points the straight line is fitted through: those in the promised range, below the knee, taken on
 * one ammeter range. Another range has another gain and offset, so a step between ranges would pass for a slope;
 * the range with the most points is kept (of two equal ones the larger), the others are left out and flagged.
 *
 * Marks the chosen points `inFit`.
 */
export function chooseFitPoints(
  usable: readonly PreparedPoint[],
  fitLimitVolts: number,
  { points: posted, ammeter }: Pick<SweepInput, 'points' | 'ammeter'>,
): FitChoice {
  const candidates = usable.filter((point) => point.inRange && point.loadVolts <= fitLimitVolts);
  const rangeOf = (point: PreparedPoint) => posted[point.index]?.ammeterRangeAmps ?? ammeter.rangeAmps ?? 0;
  const range = commonestRange(candidates.map(rangeOf));
  const points = candidates.filter((point) => rangeOf(point) === range);
  for (const point of points) point.inFit = true;
  return { points, rangeChanged: points.length < candidates.length };
}

function commonestRange(ranges: readonly number[]): number | null {
  const counts = new Map<number, number>();
  for (const range of ranges) counts.set(range, (counts.get(range) ?? 0) + 1);
  let commonest: number | null = null;
  for (const [range, count] of counts) {
    const best = commonest === null ? 0 : (counts.get(commonest) ?? 0);
    if (count > best || (count === best && commonest !== null && range > commonest)) commonest = range;
  }
  return commonest;
}
