import { measureSlope, type SimulatedBench } from './measured-slope.js';
import type { SeededRandom } from './seeded-random.js';

/** How true slopes are drawn, in δ/L: log-uniform from 0.1 to 30, or uniform from 0 to 3. */
export type SlopePopulation = 'logUniform' | 'uniform';

/** What a number of simulated sweeps of one kind showed. */
export interface CoverageCell extends SimulatedBench {
  population: SlopePopulation;
  draws: number;
  /** Share of intervals ĝ ± U that held the true slope. */
  covered: number;
  /** Mean U over the 95 % quantile of |ĝ − g|: 1 is the narrowest an interval of constant width could be. */
  relativeWidth: number;
  /** Draws that were displayed as "at least", and those of them whose claim was true. */
  boundedDraws: number;
  trueBounds: number;
}

const LOG_LOW = 0.1;
const LOG_SPAN = 300;
const UNIFORM_HIGH = 3;

/** Simulates one cell: `draws` sweeps with slopes drawn from the population. */
export function simulateCell(
  bench: SimulatedBench,
  population: SlopePopulation,
  draws: number,
  random: SeededRandom,
): CoverageCell {
  const errors = new Float64Array(draws);
  let covered = 0;
  let totalWidth = 0;
  let boundedDraws = 0;
  let trueBounds = 0;
  for (let i = 0; i < draws; i++) {
    const slope = drawSlope(population, random);
    const { conductance, uncertainty } = measureSlope(slope, bench, random);
    errors[i] = Math.abs(conductance - slope);
    totalWidth += uncertainty;
    if (Math.abs(conductance - slope) <= uncertainty) covered += 1;
    if (conductance > uncertainty) continue;
    boundedDraws += 1;
    if (slope <= Math.abs(conductance) + uncertainty) trueBounds += 1;
  }
  errors.sort();
  const typicalError = errors[Math.floor(0.95 * draws)] ?? 0;
  return {
    ...bench,
    population,
    draws,
    covered: covered / draws,
    relativeWidth: totalWidth / draws / typicalError,
    boundedDraws,
    trueBounds,
  };
}

function drawSlope(population: SlopePopulation, random: SeededRandom): number {
  return population === 'logUniform'
    ? LOG_LOW * LOG_SPAN ** random.uniform()
    : UNIFORM_HIGH * random.uniform();
}

/** The single slope of a bench whose intervals cover worst. */
export interface WorstSlope {
  slope: number;
  covered: number;
  draws: number;
}

/** Single true slopes, in δ/L: closely spaced where the meter's steps show most, then thinning out to 30. */
const SINGLE_SLOPES = [
  0, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1, 1.1, 1.25, 1.5, 1.75, 1.9, 2, 2.1, 2.25, 2.5, 2.75, 2.9,
  3, 3.5, 3.7, 4, 5, 7, 10, 14, 20, 30,
];

/** Simulates `draws` sweeps at each of 32 single slopes and returns the one covered worst. */
export function worstSingleSlope(bench: SimulatedBench, draws: number, random: SeededRandom): WorstSlope {
  let worst: WorstSlope = { slope: 0, covered: 1, draws };
  for (const slope of SINGLE_SLOPES) {
    let covered = 0;
    for (let i = 0; i < draws; i++) {
      const { conductance, uncertainty } = measureSlope(slope, bench, random);
      if (Math.abs(conductance - slope) <= uncertainty) covered += 1;
    }
    if (covered / draws < worst.covered) worst = { slope, covered: covered / draws, draws };
  }
  return worst;
}
