import type { PostedPoint } from '../types/result-post.js';
import type { LimitFacts, ProductFacts, StageFacts } from './product-facts.js';

export interface JudgedRun {
  product: ProductFacts;
  stage: StageFacts;
}

/**
 * What the station's own program says: a straight line by least squares, every measure against its limit
 * without uncertainty, and enough current at the end of the promised range. Plain on purpose: it is a second
 * opinion, and what a station falls back on when no answer comes.
 */
export function stationVerdict(
  points: readonly PostedPoint[],
  outcome: 'completed' | 'stoppedOnFail',
  run: JudgedRun,
): 'pass' | 'fail' {
  const steps = points.filter((point) => point.direction !== 'repeat' && !point.overload);
  if (outcome === 'stoppedOnFail' || steps.length < 3) return 'fail';
  const line = fitLine(steps);
  const referenceAmps = line.interceptAmps + line.slopeSiemens * run.stage.testPlan.referenceVolts;
  if (losesCurrent(steps, run.product)) return 'fail';
  const span = run.product.complianceHighVolts - run.product.complianceLowVolts;
  const figures: Record<LimitFacts['measure'], number> = {
    outputImpedance: line.slopeSiemens < 0 ? -1 / line.slopeSiemens : Infinity,
    setpointError: 100 * (referenceAmps / run.product.nominalAmps - 1),
    loadRegulation: (-100 * line.slopeSiemens * span) / referenceAmps,
  };
  return run.stage.limits.every((limit) => isInside(figures[limit.measure], limit)) ? 'pass' : 'fail';
}

function isInside(value: number, limit: LimitFacts): boolean {
  return value >= (limit.lower ?? -Infinity) && value <= (limit.upper ?? Infinity);
}

/** Whether the last step lies below the line of the lower half of the sweep by more than the tolerance. */
function losesCurrent(steps: readonly PostedPoint[], product: ProductFacts): boolean {
  const last = steps.at(-1);
  const line = fitLine(steps.slice(0, Math.max(3, Math.ceil(steps.length / 2))));
  if (!last) return true;
  const expected = line.interceptAmps + line.slopeSiemens * last.loadVolts;
  return last.outputAmps < (1 - product.complianceTolerance) * expected;
}

/** Ordinary least squares, centred (textbook formula, from memory). */
export function fitLine(points: readonly PostedPoint[]): { interceptAmps: number; slopeSiemens: number } {
  const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
  const meanVolts = mean(points.map((point) => point.loadVolts));
  const meanAmps = mean(points.map((point) => point.outputAmps));
  let sxx = 0;
  let sxy = 0;
  for (const { loadVolts, outputAmps } of points) {
    sxx += (loadVolts - meanVolts) ** 2;
    sxy += (loadVolts - meanVolts) * (outputAmps - meanAmps);
  }
  const slopeSiemens = sxx === 0 ? 0 : sxy / sxx;
  return { interceptAmps: meanAmps - slopeSiemens * meanVolts, slopeSiemens };
}
