import type { ComplianceFinding, PreparedPoint, ProductSpec } from '../analysis.types.js';
import type { RobustLine } from '../statistics/theil-sen.js';
import { endTolerance, sameVoltageWithin } from './same-voltage.js';
import {
  isOutside,
  NO_CURRENT_SHARE,
  seedCurrent,
  seedLine,
  tightenedSeed,
  type SeedLine,
} from './seed-line.js';

export interface ComplianceSearch {
  /** What is told; its `fitHighVolts` is the limit below, kept within the promised range. */
  finding: ComplianceFinding;
  /** Points above this voltage stay out of the fit: ∞ when nothing cuts it, −∞ when nothing is left. */
  fitLimitVolts: number;
  /** Where the tolerance was crossed between two points: null without a knee that lies between points. */
  crossing: ToleranceCrossing | null;
}

export interface ToleranceCrossing {
  volts: number;
  /** Distance between the last inside and the first outside point. */
  stepVolts: number;
  /** How far the crossing moves when one of the two currents changes: V per A; ∞ when it can't be interpolated. */
  voltsPerAmp: number;
}

/**
 * Finds up to which load voltage the unit holds its current.
 *
 * Seed line Î(V): Theil–Sen through the points in the lower half of the promised range (at least 4). A point is
 * outside when I < (1−τ)·Î (only loss of current counts) or when it carries less than a tenth of the nominal
 * current. The knee is the first outside point that is followed by another one or by the end. The compliance
 * voltage is where I/Î − 1 crosses −τ, interpolated linearly between the last inside and the first outside point;
 * with no knee it is *at least* the highest tested voltage, with a knee at the first point *at most* that.
 *
 * An output of which no point carries a tenth of the nominal current has the reason `noCurrent`, wherever it was
 * tested.
 *
 * With fewer than 4 points in the lower half no knee is claimed. The absence of one is still proven when all
 * currents lie within τ of the largest.
 *
 * A knee in the lower half bends the seed line itself; then a line through the points below that knee finds it.
 *
 * When the compliance voltage is short of V_hi the fit ends one load step below the last inside point and serves
 * diagnosis only; a knee above V_hi merely keeps the points beyond it out.
 *
 * @param points - usable points by ascending voltage
 */
export function findCompliance(points: readonly PreparedPoint[], product: ProductSpec): ComplianceSearch {
  const tested = points.filter(
    (point) => point.loadVolts >= product.complianceLowVolts - endTolerance(product),
  );
  const highest = tested.at(-1);
  // A dead output on a resistor as load never reaches V_lo: all its points count then.
  const asked = highest === undefined ? points : tested;
  if (asked.length > 0 && deliversNothing(asked, product)) {
    const lowest = asked[0]!.loadVolts;
    return finding({ complianceVolts: lowest, bound: 'atMost', reason: 'noCurrent' }, Infinity, product);
  }
  if (highest === undefined) return untold('notMeasured', product);
  const seed = seedLine(tested, product);
  if (seed === null) {
    return withinToleranceOfLargest(tested, product)
      ? heldUpTo(highest, product)
      : untold('fewPoints', product);
  }
  const early = earlyKnee(tested, seed, product);
  if (early !== null) return early;
  const knee = kneeIndex(tested, seed, product);
  return knee === null ? heldUpTo(highest, product) : shortAt(tested, knee, seed, product);
}

/** A knee among the seed's own points, found by a seed line drawn below it; null when there is none. */
function earlyKnee(
  points: readonly PreparedPoint[],
  seed: SeedLine,
  product: ProductSpec,
): ComplianceSearch | null {
  const tightened = tightenedSeed(seed, product);
  if (tightened === null) return null;
  const knee = kneeIndex(points, tightened, product);
  return knee !== null && knee < seed.points.length ? shortAt(points, knee, tightened, product) : null;
}

/** Whether no point carries a tenth of the nominal current. */
function deliversNothing(points: readonly PreparedPoint[], product: ProductSpec): boolean {
  return points.every((point) => point.outputAmps < NO_CURRENT_SHARE * product.nominalAmps);
}

function withinToleranceOfLargest(points: readonly PreparedPoint[], product: ProductSpec): boolean {
  const largest = points.reduce((most, point) => Math.max(most, point.outputAmps), 0);
  return points.every((point) => point.outputAmps >= (1 - product.complianceTolerance) * largest);
}

function kneeIndex(points: readonly PreparedPoint[], seed: RobustLine, product: ProductSpec): number | null {
  for (let i = 0; i < points.length; i++) {
    if (!isOutside(points[i]!, seed, product)) continue;
    const next = points[i + 1];
    if (next === undefined || isOutside(next, seed, product)) return i;
  }
  return null;
}

function shortAt(
  points: readonly PreparedPoint[],
  knee: number,
  seed: RobustLine,
  product: ProductSpec,
): ComplianceSearch {
  const outside = points[knee]!;
  const inside = points[knee - 1];
  if (inside === undefined) {
    const lowest = { kneeFound: true, complianceVolts: outside.loadVolts, bound: 'atMost' } as const;
    return finding(lowest, -Infinity, product);
  }
  const crossing = crossingBetween(inside, outside, seed, product.complianceTolerance);
  const isShort = crossing.volts < product.complianceHighVolts;
  const fitLimitVolts = isShort
    ? stepBelow(points, knee - 1, sameVoltageWithin(product))
    : (inside.loadVolts + outside.loadVolts) / 2;
  return finding({ kneeFound: true, complianceVolts: crossing.volts }, fitLimitVolts, product, crossing);
}

/** Where I/Î − 1 passes −τ on the straight line between two points. */
function crossingBetween(
  inside: PreparedPoint,
  outside: PreparedPoint,
  seed: RobustLine,
  tolerance: number,
): ToleranceCrossing {
  const above = excess(inside, seed, tolerance);
  const below = excess(outside, seed, tolerance);
  const stepVolts = outside.loadVolts - inside.loadVolts;
  const lost = above - below;
  const share = lost > 0 ? Math.min(1, Math.max(0, above / lost)) : 1;
  const expected = seedCurrent(seed, outside);
  return {
    volts: inside.loadVolts + share * stepVolts,
    stepVolts,
    voltsPerAmp: lost > 0 && expected > 0 ? stepVolts / lost / expected : Infinity,
  };
}

/** I/Î − 1 + τ: what is left of the tolerance, as a fraction. */
function excess(point: PreparedPoint, seed: RobustLine, tolerance: number): number {
  const expected = seedCurrent(seed, point);
  return expected > 0 ? point.outputAmps / expected - 1 + tolerance : 0;
}

/** Voltage of the load step below that of the given point; −∞ when there is none. */
function stepBelow(points: readonly PreparedPoint[], index: number, toleranceVolts: number): number {
  const volts = points[index]?.loadVolts ?? -Infinity;
  for (let i = index - 1; i >= 0; i--) {
    if (volts - points[i]!.loadVolts > toleranceVolts) return points[i]!.loadVolts;
  }
  return -Infinity;
}

function heldUpTo(highest: PreparedPoint, product: ProductSpec): ComplianceSearch {
  return finding({ complianceVolts: highest.loadVolts, bound: 'atLeast' }, Infinity, product);
}

function untold(reason: string, product: ProductSpec): ComplianceSearch {
  return finding({ reason }, Infinity, product);
}

function finding(
  known: Partial<ComplianceFinding>,
  fitLimitVolts: number,
  { complianceLowVolts, complianceHighVolts }: ProductSpec,
  crossing: ToleranceCrossing | null = null,
): ComplianceSearch {
  const fitHighVolts = Math.min(complianceHighVolts, Math.max(complianceLowVolts, fitLimitVolts));
  return {
    finding: {
      kneeFound: known.kneeFound ?? false,
      complianceVolts: known.complianceVolts ?? null,
      bound: known.bound ?? 'exact',
      fitHighVolts,
      reason: known.reason ?? null,
    },
    fitLimitVolts,
    crossing,
  };
}
