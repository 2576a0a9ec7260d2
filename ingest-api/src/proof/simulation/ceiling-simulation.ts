import { impedanceCeiling } from '../../analysis/uncertainty/impedance-ceiling.js';
import { measureSlope, type SimulatedBench } from './measured-slope.js';
import type { SeededRandom } from './seeded-random.js';

/** What the impedance ceiling of a bench is worth. */
export interface CeilingCell extends SimulatedBench {
  draws: number;
  /** G₀ in δ/L. */
  ceilingConductance: number;
  /** Share of units at twice the ceiling that were displayed as a bound. */
  twiceBounded: number;
  /** Share of units at a tenth of the ceiling that were measured with both ends. */
  tenthMeasured: number;
}

/** Simulates units at twice and at a tenth of the impedance ceiling of a bench. */
export function simulateCeiling(bench: SimulatedBench, draws: number, random: SeededRandom): CeilingCell {
  const loadVolts = Array.from({ length: bench.pointCount }, (_, i) => i / (bench.pointCount - 1));
  const { conductanceSiemens } = impedanceCeiling({ loadVolts, resolutionAmps: 1, scatterAmps: bench.noise });
  const isMeasured = (conductance: number) => {
    const measured = measureSlope(conductance, bench, random);
    return measured.conductance > measured.uncertainty;
  };
  let bounded = 0;
  let measured = 0;
  for (let i = 0; i < draws; i++) {
    if (!isMeasured(conductanceSiemens / 2)) bounded += 1;
    if (isMeasured(conductanceSiemens * 10)) measured += 1;
  }
  return {
    ...bench,
    draws,
    ceilingConductance: conductanceSiemens,
    twiceBounded: bounded / draws,
    tenthMeasured: measured / draws,
  };
}
