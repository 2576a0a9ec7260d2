import type { LimitRule } from '../analysis.types.js';
import type { ToleranceInterval } from '../risk/conformity-probability.js';

export type ConformityOutcome = 'pass' | 'fail' | 'notProven';

export interface ConformityQuestion {
  value: number;
  /** U ≥ 0, k ≈ 2, in the unit of the value. */
  expandedUncertainty: number;
  tolerance: ToleranceInterval;
  rule: LimitRule;
  /** Guard band w = guardFactor · U. */
  guardFactor: number;
  /** Largest U for which the `simple` rule applies, in the unit of the value. */
  largestAdequateUncertainty: number;
}

/** Decimal limits and values are rarely exact in binary: differences this small, relatively, are equality. */
const ROUNDING = 1e-12;

/**
 * Decides one value against one tolerance.
 *
 * With the margin `m` (distance to the nearer limit, positive inside) and the guard band `w`:
 *
 * - `guarded`: pass when `m ≥ w`, fail when `m < −w`, else `notProven`. With factor 1 and U at k = 2 the risk of
 *   a wrong pass or fail at one limit is at most 2.3 % (0.8225·U would make it 5 %).
 * - `simple`: pass when `m ≥ 0`, else fail — as long as U is adequate; a larger U falls back to `guarded`.
 *
 * A value exactly on a limit, or exactly w inside it, passes; comparisons allow for binary rounding (10⁻¹²
 * relative). The outcome never gets worse when the margin grows and U stays.
 *
 * @see ISO 14253-1; JCGM 106:2012, clause 8
 */
export function decideConformity(question: ConformityQuestion): ConformityOutcome {
  const { value, expandedUncertainty, tolerance, guardFactor } = question;
  const margin = marginInside(value, tolerance);
  const slack = ROUNDING * largestMagnitude(value, tolerance);
  const adequate = expandedUncertainty <= question.largestAdequateUncertainty * (1 + ROUNDING);
  if (question.rule === 'simple' && adequate) return margin >= -slack ? 'pass' : 'fail';
  const guardBand = guardFactor * expandedUncertainty;
  if (margin >= guardBand - slack) return 'pass';
  return margin < -guardBand - slack ? 'fail' : 'notProven';
}

/** Distance from the value to the nearer limit, positive inside; infinite when both sides are open. */
function marginInside(value: number, { lower, upper }: ToleranceInterval): number {
  return Math.min(lower === null ? Infinity : value - lower, upper === null ? Infinity : upper - value);
}

function largestMagnitude(value: number, { lower, upper }: ToleranceInterval): number {
  return Math.max(Math.abs(value), Math.abs(lower ?? 0), Math.abs(upper ?? 0));
}
