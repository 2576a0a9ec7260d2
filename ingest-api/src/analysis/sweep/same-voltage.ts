import type { ProductSpec } from '../analysis.types.js';

/**
 * Voltages closer together than this (V) are one load step: 0.1 % of the promised range. A commanded step is
 * never met to the last digit, and a pair of points this close says nothing about a slope.
 */
export function sameVoltageWithin(product: ProductSpec): number {
  return 1e-3 * promisedSpan(product);
}

/**
 * Points this far (V) outside the promised range still count as its ends: 2 % of the range. The ammeter's burden
 * moves the last step a little beyond V_hi, and no station meets an end exactly.
 */
export function endTolerance(product: ProductSpec): number {
  return 0.02 * promisedSpan(product);
}

export function promisedSpan(product: ProductSpec): number {
  return product.complianceHighVolts - product.complianceLowVolts;
}

/** How many load steps ascending voltages hold, when those within the tolerance of a step's first are one. */
export function countSteps(ascendingVolts: ArrayLike<number>, toleranceVolts: number): number {
  let steps = 0;
  let stepStart = -Infinity;
  for (let i = 0; i < ascendingVolts.length; i++) {
    if (ascendingVolts[i]! - stepStart <= toleranceVolts) continue;
    steps += 1;
    stepStart = ascendingVolts[i]!;
  }
  return steps;
}
