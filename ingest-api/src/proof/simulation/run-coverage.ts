import { simulateCeiling, type CeilingCell } from './ceiling-simulation.js';
import { simulateCell, worstSingleSlope, type CoverageCell, type WorstSlope } from './coverage-cell.js';
import { ShortfallFinder, type Shortfall } from './coverage-shortfalls.js';
import { simulateKnee, type KneeCell, type KneeShape } from './knee-simulation.js';
import type { SimulatedBench } from './measured-slope.js';
import { seededRandom } from './seeded-random.js';

const POINT_COUNTS = [5, 12, 40];
const NOISES = [0, 0.1, 0.2, 0.3, 0.5, 1, 3];
const KNEE_POINT_COUNTS = [12, 20, 40];
const KNEE_SHAPES: KneeShape[] = [0.05, 0.2, 0.5].flatMap((lossVolts) => [
  { lossVolts, law: 'straight' as const },
  { lossVolts, law: 'rounded' as const },
]);

/** Draws from which on the aims must be met as they stand. */
const WHOLE_RUN = 20_000;

export interface CoverageOptions {
  /** Simulated sweeps in each cell; 20,000 for the whole proof. */
  draws: number;
  /** Sweeps at each single slope, in each ceiling cell and in each knee cell; a tenth of `draws` unless given. */
  drawsEach?: number;
  /**
   * How many standard errors of the simulation a figure may miss its aim by. Unless given: 0 for a whole run, 3 for
   * one of fewer than 20,000 draws, whose figures wander.
   */
  allowance?: number;
  /** The same seed gives the same report. */
  seed?: number;
}

export interface BenchReport extends SimulatedBench {
  cells: CoverageCell[];
  worst: WorstSlope;
  ceiling: CeilingCell;
}

export interface CoverageReport {
  benches: BenchReport[];
  knees: KneeCell[];
  /** Share of all "at least" claims that are true. */
  trueBounds: number;
  boundedDraws: number;
  /** Standard errors that figures were allowed to miss their aims by. */
  allowance: number;
  shortfalls: Shortfall[];
}

/**
 * Simulates the whole method of the slope: does the 95 % interval cover, is it narrow, is "at least" true, does the
 * impedance ceiling keep its promise, is the knee found?
 *
 * Every sweep has a true line, a random phase of the meter's steps, normal noise and rounding, and goes through the
 * fit and the uncertainty that results are judged by. 5, 12 and 40 points; σ/δ from 0 to 3; slopes drawn
 * log-uniform from 0.1 to 30 δ/L, uniform from 0 to 3 δ/L, and 32 single ones.
 *
 * Cost: about 2.3 million simulated sweeps at 20,000 draws, a quarter of a minute of computing.
 */
export function runCoverage({
  draws,
  drawsEach = Math.ceil(draws / 10),
  allowance = draws >= WHOLE_RUN ? 0 : 3,
  seed = 1,
}: CoverageOptions): CoverageReport {
  const random = seededRandom(seed);
  const benches = POINT_COUNTS.flatMap((pointCount) => NOISES.map((noise) => ({ pointCount, noise }))).map(
    (bench) => ({
      ...bench,
      cells: [
        simulateCell(bench, 'logUniform', draws, random),
        simulateCell(bench, 'uniform', draws, random),
      ],
      worst: worstSingleSlope(bench, drawsEach, random),
      ceiling: simulateCeiling(bench, drawsEach, random),
    }),
  );
  const knees = KNEE_POINT_COUNTS.flatMap((pointCount) =>
    KNEE_SHAPES.map((shape) => simulateKnee(pointCount, shape, drawsEach, random)),
  );
  const bounds = countBounds(benches.flatMap((bench) => bench.cells));
  const measured = { benches, knees, ...bounds, allowance };
  return { ...measured, shortfalls: findShortfalls(measured) };
}

function findShortfalls(measured: Omit<CoverageReport, 'shortfalls'>): Shortfall[] {
  const { benches, knees, trueBounds, boundedDraws, allowance } = measured;
  const find = new ShortfallFinder(allowance);
  return [
    ...benches.flatMap((bench) => [
      ...bench.cells.flatMap((cell) => find.inCell(cell)),
      ...find.atSlope(bench, bench.worst),
      ...find.atCeiling(bench.ceiling),
    ]),
    ...knees.flatMap((knee) => find.atKnee(knee)),
    ...find.inBounds(trueBounds, boundedDraws),
  ];
}

function countBounds(cells: readonly CoverageCell[]): { trueBounds: number; boundedDraws: number } {
  const boundedDraws = cells.reduce((sum, cell) => sum + cell.boundedDraws, 0);
  const held = cells.reduce((sum, cell) => sum + cell.trueBounds, 0);
  return { trueBounds: boundedDraws === 0 ? 1 : held / boundedDraws, boundedDraws };
}
