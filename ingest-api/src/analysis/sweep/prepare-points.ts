import type { PreparedPoint, SweepInput } from '../analysis.types.js';
import { endTolerance } from './same-voltage.js';

/** Meters report an overload as a huge number (9.9·10³⁷ by convention); no bench reaches this (V or A). */
const LARGEST_PLAUSIBLE = 1e6;

/**
 * Brings posted points to the output terminals of the unit.
 *
 * Formula: V = loadVolts + I·burdenOhms unless the voltmeter spans the ammeter; then
 * I_out = I + V/R for every path R in parallel with the load that bypasses the ammeter: the fixture's leakage
 * always, the voltmeter's input resistance when its leads span load and ammeter together (otherwise its
 * current runs through the ammeter and is counted already). Repeats are kept. A point is in range when V lies in
 * the promised range widened by 2 %.
 *
 * @returns one point for each posted one, in the same order, `inFit` still false; implausibly large ones
 *   count as overload, their figures set to zero
 */
export function preparePoints(input: SweepInput): PreparedPoint[] {
  const burdenOhms = input.voltmeter.spansAmmeter === true ? 0 : (input.ammeter.burdenOhms ?? 0);
  const leakageSiemens = parallelConductance(input);
  const { complianceLowVolts, complianceHighVolts } = input.product;
  const slack = endTolerance(input.product);
  return input.points.map((point, index) => {
    const loadVolts = point.loadVolts + point.outputAmps * burdenOhms;
    const outputAmps = point.outputAmps + loadVolts * leakageSiemens;
    const overload = point.overload === true || !isPlausible(loadVolts) || !isPlausible(outputAmps);
    return {
      index,
      loadVolts: isPlausible(loadVolts) ? loadVolts : 0,
      outputAmps: isPlausible(outputAmps) ? outputAmps : 0,
      direction: point.direction ?? null,
      elapsedMs: point.elapsedMs ?? null,
      outputAmpsStdDev: point.outputAmpsStdDev ?? null,
      rangeAmps: point.ammeterRangeAmps ?? input.ammeter.rangeAmps ?? null,
      overload,
      inFit: false,
      inRange: loadVolts >= complianceLowVolts - slack && loadVolts <= complianceHighVolts + slack,
    };
  });
}

function parallelConductance({ voltmeter, fixtureLeakageOhms }: SweepInput): number {
  const voltmeterOhms = voltmeter.spansAmmeter === true ? voltmeter.inputOhms : undefined;
  return conductanceOf(fixtureLeakageOhms) + conductanceOf(voltmeterOhms);
}

function conductanceOf(ohms: number | undefined): number {
  return ohms !== undefined && ohms > 0 ? 1 / ohms : 0;
}

function isPlausible(reading: number): boolean {
  return Math.abs(reading) <= LARGEST_PLAUSIBLE;
}

/** The points that carry a reading, by ascending voltage, then current: the order of the post is forgotten. */
export function usableByVoltage(points: readonly PreparedPoint[]): PreparedPoint[] {
  return points.filter((point) => !point.overload).sort(byVoltage);
}

export function byVoltage(a: PreparedPoint, b: PreparedPoint): number {
  return a.loadVolts - b.loadVolts || a.outputAmps - b.outputAmps;
}
