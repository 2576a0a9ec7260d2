import type { PreparedPoint, ProductSpec } from '../../analysis/analysis.types.js';
import { findCompliance } from '../../analysis/sweep/find-compliance.js';
import { pointAt } from './measured-slope.js';
import type { SeededRandom } from './seeded-random.js';

/** A unit of 1 A, promised from 0 to 1 V within 1 %. */
const UNIT: ProductSpec = {
  nominalAmps: 1,
  supplyVolts: 1.1,
  complianceLowVolts: 0,
  complianceHighVolts: 1,
  complianceTolerance: 0.01,
  circuitKind: 'other',
  hasEmitterResistors: false,
};
const NOISE = 0.002;
const FALL_PER_VOLT = 0.01;

/** Beyond the knee the current is lost over this many volts, evenly or ever faster. */
export interface KneeShape {
  lossVolts: number;
  law: 'straight' | 'rounded';
}

export interface KneeCell extends KneeShape {
  pointCount: number;
  draws: number;
  /** Share of compliance voltages within one load step of the true one. */
  withinStep: number;
  /** Share of units without a knee in which one was claimed. */
  falseKnees: number;
}

/**
 * Simulates units whose knee lies anywhere from 30 to 98 % of the promised range (below that fewer than 4 of 12
 * points are left for a seed line), read with 0.2 % noise, and as many without a knee.
 */
export function simulateKnee(
  pointCount: number,
  shape: KneeShape,
  draws: number,
  random: SeededRandom,
): KneeCell {
  const step = 1 / (pointCount - 1);
  let withinStep = 0;
  let falseKnees = 0;
  for (let i = 0; i < draws; i++) {
    const kneeVolts = 0.3 + 0.68 * random.uniform();
    const found = findCompliance(sweepOf(pointCount, kneeVolts, shape, random), UNIT).finding;
    // A crossing beyond the last point can't be seen: "at least the last point" is then the right answer.
    const error = Math.abs(
      (found.complianceVolts ?? Infinity) - Math.min(1, crossingVolts(kneeVolts, shape)),
    );
    if (error <= step) withinStep += 1;
    if (findCompliance(sweepOf(pointCount, 2, shape, random), UNIT).finding.kneeFound) falseKnees += 1;
  }
  return { ...shape, pointCount, draws, withinStep: withinStep / draws, falseKnees: falseKnees / draws };
}

function sweepOf(
  pointCount: number,
  kneeVolts: number,
  shape: KneeShape,
  random: SeededRandom,
): PreparedPoint[] {
  return Array.from({ length: pointCount }, (_, index) => {
    const volts = index / (pointCount - 1);
    return pointAt(index, volts, trueCurrent(volts, kneeVolts, shape) + NOISE * random.normal());
  });
}

function trueCurrent(volts: number, kneeVolts: number, { lossVolts, law }: KneeShape): number {
  const beyond = Math.max(0, volts - kneeVolts) / lossVolts;
  const lost = law === 'straight' ? beyond : beyond ** 2;
  return (1 - FALL_PER_VOLT * volts) * Math.max(0, 1 - lost);
}

/** Where the true current has lost τ. */
function crossingVolts(kneeVolts: number, { lossVolts, law }: KneeShape): number {
  const tolerance = UNIT.complianceTolerance;
  return kneeVolts + lossVolts * (law === 'straight' ? tolerance : Math.sqrt(tolerance));
}
