import type { PreparedPoint, ProductSpec } from '../analysis.types.js';
import { theilSenLine, type RobustLine } from '../statistics/theil-sen.js';
import { promisedSpan, sameVoltageWithin } from './same-voltage.js';

/** A seed line is drawn through no fewer points than this. */
const FEWEST_SEED_POINTS = 4;

/** Below this share of the nominal current the unit delivers nothing, whatever its seed line says. */
export const NO_CURRENT_SHARE = 0.1;

/** A robust line of what the unit delivers while it is inside compliance, and the points it was drawn through. */
export interface SeedLine extends RobustLine {
  points: readonly PreparedPoint[];
}

/**
 * The seed line Î(V): Theil–Sen through the points in the lower half of the promised range, where a unit that is
 * any good still holds its current.
 *
 * @param points - by ascending voltage, from V_lo on
 * @returns null with fewer than 4 points there, or all at one voltage
 */
export function seedLine(points: readonly PreparedPoint[], product: ProductSpec): SeedLine | null {
  const middle = product.complianceLowVolts + promisedSpan(product) / 2;
  const lower = points.filter((point) => point.loadVolts <= middle);
  return lineThrough(lower, product);
}

/**
 * A seed line that a knee in the lower half itself cannot bend: while two or more points of the seed lie off it by
 * more than τ, the upper 30 % of them are dropped, down to 4. Null when the seed needs no such care.
 */
export function tightenedSeed(seed: SeedLine, product: ProductSpec): SeedLine | null {
  let line: SeedLine = seed;
  while (line.points.length > FEWEST_SEED_POINTS && countOff(line, product) >= 2) {
    const kept = Math.max(FEWEST_SEED_POINTS, Math.floor(0.7 * line.points.length));
    const lower = lineThrough(line.points.slice(0, kept), product);
    if (lower === null) break;
    line = lower;
  }
  return line === seed ? null : line;
}

/** Whether a point lost more than τ of the seed line's current, or carries less than a tenth of the nominal. */
export function isOutside(point: PreparedPoint, seed: RobustLine, product: ProductSpec): boolean {
  return (
    point.outputAmps < NO_CURRENT_SHARE * product.nominalAmps ||
    point.outputAmps < (1 - product.complianceTolerance) * seedCurrent(seed, point)
  );
}

/** Î in A at the point's voltage. */
export function seedCurrent(seed: RobustLine, point: PreparedPoint): number {
  return seed.intercept + seed.slope * point.loadVolts;
}

function lineThrough(points: readonly PreparedPoint[], product: ProductSpec): SeedLine | null {
  const first = points[0];
  const last = points.at(-1);
  if (first === undefined || last === undefined || points.length < FEWEST_SEED_POINTS) return null;
  if (last.loadVolts - first.loadVolts <= sameVoltageWithin(product)) return null;
  const line = theilSenLine(
    points.map((point) => point.loadVolts),
    points.map((point) => point.outputAmps),
    sameVoltageWithin(product),
  );
  return { ...line, points };
}

function countOff(seed: SeedLine, product: ProductSpec): number {
  return seed.points.filter((point) => {
    const expected = seedCurrent(seed, point);
    return Math.abs(point.outputAmps - expected) > product.complianceTolerance * Math.abs(expected);
  }).length;
}
