import type { PreparedPoint, SlopeUncertainty } from '../analysis.types.js';
import { tQuantile } from '../distributions/student-t.js';
import type { RangePoints } from './choose-fit-points.js';
import { fitRanges, type RangesFit } from './fit-ranges.js';
import { fitSweep, type SweepFit } from './fit-sweep.js';
import { areWeights } from './line-through.js';
import { byVoltage } from './prepare-points.js';
import { countSteps } from './same-voltage.js';

/** A fit and the points it was made of, all at the level of the main ammeter range. */
export interface LevelledSweep extends SweepFit {
  usable: readonly PreparedPoint[];
  fitted: readonly PreparedPoint[];
  ranges: readonly RangePoints[];
  /** Null with one range. */
  rangesFit: RangesFit | null;
}

/**
 * Fits the chosen points and brings the readings of other ammeter ranges to the level of the main one, so that
 * measures that compare readings don't take a step between ranges for a property of the unit. Points on ranges of
 * unknown level are left out of `usable`. With one range everything stays as it is.
 *
 * @param ranges - as chosen for the fit, the main one first
 */
export function fitAndLevel(
  usable: readonly PreparedPoint[],
  ranges: readonly RangePoints[],
  sameVolts: number,
): LevelledSweep {
  if (ranges.length < 2) {
    const main = ranges[0];
    const onMain = main === undefined ? usable : readOn(main, usable);
    const fitted = main?.points ?? [];
    const { fit, steps, weightsUnused } = fitSweep(fitted, sameVolts);
    return { fit, steps, weightsUnused, usable: onMain, fitted, ranges, rangesFit: null };
  }
  const points = ranges.flatMap((range) => range.points).sort(byVoltage);
  const weighted = areWeights(points);
  const rangesFit = fitRanges(ranges, weighted);
  const levelled = (of: readonly PreparedPoint[]) =>
    of.flatMap((point) => {
      const offset = rangesFit.offsetAmps.get(point.rangeAmps);
      return offset === undefined ? [] : [{ ...point, outputAmps: point.outputAmps - offset }];
    });
  return {
    fit: rangesFit.fit,
    steps: countSteps(
      points.map((point) => point.loadVolts),
      sameVolts,
    ),
    weightsUnused: !weighted && points.some((point) => point.outputAmpsStdDev !== null),
    usable: levelled(usable),
    fitted: levelled(points).sort(byVoltage),
    ranges,
    rangesFit,
  };
}

/** The same array when there is nothing to leave out, as nearly always. */
function readOn({ rangeAmps }: RangePoints, usable: readonly PreparedPoint[]): readonly PreparedPoint[] {
  const isOn = (point: PreparedPoint) => point.rangeAmps === rangeAmps;
  return usable.every(isOn) ? usable : usable.filter(isOn);
}

/**
 * Expanded uncertainty (A) of the level of one range against another: √((U·ΔV̄)² + (t·s·√(1/n₁ + 1/nₖ))²), for the
 * range farthest from the main one, U that of the slope which carries the level from one to the other.
 */
export function levelUncertainty(rangesFit: RangesFit, slope: SlopeUncertainty | null): number {
  const { fit, farthestVolts, meansLeverage } = rangesFit;
  const scatter = tQuantile(0.975, fit.degreesOfFreedom) * fit.residualStdDev;
  return Math.hypot(farthestVolts * (slope?.expanded ?? 0), scatter * meansLeverage);
}
