import type { CeilingCell } from './ceiling-simulation.js';
import type { CoverageCell, WorstSlope } from './coverage-cell.js';
import type { KneeCell } from './knee-simulation.js';
import type { SimulatedBench } from './measured-slope.js';

/** Mean interval over the 95 % quantile of the error, at most, by number of points. */
const LARGEST_RELATIVE_WIDTH: ReadonlyMap<number, number> = new Map([
  [5, 2.2],
  [12, 1.6],
  [40, 1.4],
]);

/** One simulated figure that does not meet its aim. */
export interface Shortfall {
  what: string;
  aim: string;
  measured: string;
}

/**
 * Compares simulated figures with their aims.
 *
 * `allowance` is how many standard errors of the simulation a figure may miss its aim by: 0 for a whole run, which
 * must meet the aims as they stand, 3 for a short one, whose figures wander.
 */
export class ShortfallFinder {
  constructor(private readonly allowance: number) {}

  /**
   * Populations: coverage of at least 93 %, of 93 to 97 % where the scatter is a step or more, and a mean width of
   * at most 2.2, 1.6 or 1.4 times the 95 % quantile of the error at 5, 12 or 40 points.
   */
  inCell(cell: CoverageCell): Shortfall[] {
    const where = `${describeBench(cell)}, ${cell.population} slopes`;
    const largestWidth = LARGEST_RELATIVE_WIDTH.get(cell.pointCount) ?? Infinity;
    const widthAllowed = largestWidth * (1 + (1.5 * this.allowance) / Math.sqrt(cell.draws));
    return [
      ...this.below(`coverage, ${where}`, cell.covered, 0.93, cell.draws),
      ...(cell.noise >= 1 ? this.above(`coverage, ${where}`, cell.covered, 0.97, cell.draws) : []),
      ...(cell.relativeWidth <= widthAllowed
        ? []
        : [{ what: `width, ${where}`, aim: `≤ ${largestWidth}`, measured: cell.relativeWidth.toFixed(2) }]),
    ];
  }

  /** Coverage of at least 90 % at every single slope. */
  atSlope(bench: SimulatedBench, worst: WorstSlope): Shortfall[] {
    const what = `coverage at slope ${worst.slope}, ${describeBench(bench)}`;
    return this.below(what, worst.covered, 0.9, worst.draws);
  }

  /** "At least" true in at least 95 % of the draws that claim it. */
  inBounds(trueShare: number, draws: number): Shortfall[] {
    return this.below('"at least" claims that are true', trueShare, 0.95, draws);
  }

  /** Bounded in ≥ 90 % at twice the ceiling for σ ≤ 0.2 δ; measured in ≥ 95 % at a tenth of it, always. */
  atCeiling(cell: CeilingCell): Shortfall[] {
    const where = describeBench(cell);
    const twice = `bounded at twice the ceiling, ${where}`;
    return [
      ...(cell.noise > 0.2 ? [] : this.below(twice, cell.twiceBounded, 0.9, cell.draws)),
      ...this.below(`measured at a tenth of the ceiling, ${where}`, cell.tenthMeasured, 0.95, cell.draws),
    ];
  }

  /** Compliance voltage within one load step in ≥ 98 %. */
  atKnee(cell: KneeCell): Shortfall[] {
    const where = `${cell.pointCount} points, ${cell.law} loss over ${cell.lossVolts} of the range`;
    return this.below(`knee within a step, ${where}`, cell.withinStep, 0.98, cell.draws);
  }

  private below(what: string, share: number, aim: number, draws: number): Shortfall[] {
    if (share >= aim - this.tolerated(aim, draws)) return [];
    return [{ what, aim: `≥ ${100 * aim} %`, measured: percent(share) }];
  }

  private above(what: string, share: number, aim: number, draws: number): Shortfall[] {
    if (share <= aim + this.tolerated(aim, draws)) return [];
    return [{ what, aim: `≤ ${100 * aim} %`, measured: percent(share) }];
  }

  private tolerated(aim: number, draws: number): number {
    return this.allowance * Math.sqrt((aim * (1 - aim)) / draws);
  }
}

function describeBench({ pointCount, noise }: SimulatedBench): string {
  return `${pointCount} points, σ = ${noise} δ`;
}

/** 0.9512 → "95.12 %". */
export function percent(share: number): string {
  return `${(100 * share).toFixed(2)} %`;
}
