import { requireCounts } from './counts.js';
import { wilsonInterval } from './wilson-interval.js';

export interface StageCount {
  /** Units whose first attempt passed. */
  passed: number;
  total: number;
}

export interface RolledThroughput {
  /** Product of the stages' first-pass yields. */
  share: number;
  low: number;
  high: number;
}

/**
 * Rolled-throughput yield: the share of units that go through every stage at the first attempt, as the product
 * of the stages' first-pass yields, with an interval by square-and-add on logarithms:
 *
 * `ln low = ln R − √Σ(ln pᵢ − ln lᵢ)²`, `ln high = ln R + √Σ(ln uᵢ − ln pᵢ)²`, capped at 1,
 *
 * where [lᵢ, uᵢ] is the stage's Wilson interval. The stages' outcomes are taken as independent. With one stage
 * this is the Wilson interval itself.
 *
 * A stage that nobody passed has no logarithm; then R = 0, low = 0, and high is the smallest upper end of such
 * stages, because the product cannot exceed any of its factors.
 *
 * This is not the first-time yield of the whole process, 1 − (all scrap and rework)/started: that adds up the
 * stages' losses and gives a slightly different number.
 *
 * @returns null without stages, or when a stage has no unit yet
 * @throws RangeError when a count is not a whole number with 0 ≤ passed ≤ total
 * @see Zou & Donner, Statistics in Medicine 27 (2008) 1693 (square-and-add, "MOVER"); from memory
 * @example rolledThroughput([{ passed: 95, total: 100 }, { passed: 90, total: 95 }])?.share // 0.9
 */
export function rolledThroughput(stages: readonly StageCount[]): RolledThroughput | null {
  for (const { passed, total } of stages) requireCounts(passed, total, 'rolledThroughput');
  if (stages.length === 0 || stages.some(({ total }) => total === 0)) return null;
  const shares = stages.map(({ passed, total }) => ({
    share: passed / total,
    ...(wilsonInterval(passed, total) ?? { low: 0, high: 1 }),
  }));
  const none = shares.filter(({ share }) => share === 0);
  if (none.length > 0) return { share: 0, low: 0, high: Math.min(...none.map(({ high }) => high)) };
  const share = shares.reduce((product, stage) => product * stage.share, 1);
  const below = Math.hypot(...shares.map((stage) => Math.log(stage.share / stage.low)));
  const above = Math.hypot(...shares.map((stage) => Math.log(stage.high / stage.share)));
  return { share, low: share * Math.exp(-below), high: Math.min(1, share * Math.exp(above)) };
}
