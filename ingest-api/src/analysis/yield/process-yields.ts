import { requireCounts } from './counts.js';

/** Losses of one step of a process, in units. */
export interface StepLosses {
  /** Scrapped. */
  defects: number;
  /** Passed only after rework. */
  rework: number;
}

export interface ProcessYields {
  /** (started − scrapped)/started: what comes out in the end. */
  yield: number;
  /** (started − scrapped − reworked)/started, over all steps together. */
  firstTimeYield: number;
  /** Product of the steps' own first-time yields. */
  rolledThroughput: number;
  defects: number;
  defectsPerMillion: number;
}

/**
 * Yields of a process of several steps from its scrap and rework.
 *
 * Rolled-throughput yield multiplies the steps' yields, each taken of the units started; the first-time yield of
 * the whole adds their losses up. The two are close but not equal, and are often confused.
 *
 * @param started - units that entered the process, a whole number above 0
 * @throws RangeError when losses are not whole numbers or exceed the units started
 * @see E. L. Cano, J. M. Moguerza, A. Redchuk, Six Sigma with R (Springer, 2012)
 */
export function processYields(started: number, steps: readonly StepLosses[]): ProcessYields {
  const defects = steps.reduce((sum, step) => sum + step.defects, 0);
  const lost = steps.reduce((sum, step) => sum + step.defects + step.rework, 0);
  requireCounts(lost, started, 'processYields');
  if (started === 0) throw new RangeError('processYields requires at least one unit');
  return {
    yield: (started - defects) / started,
    firstTimeYield: (started - lost) / started,
    rolledThroughput: steps.reduce(
      (product, step) => product * (1 - (step.defects + step.rework) / started),
      1,
    ),
    defects,
    defectsPerMillion: (1e6 * defects) / started,
  };
}
