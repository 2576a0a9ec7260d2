import type {
  Limit,
  Measure,
  MeasureJudgement,
  MeasureName,
  Outcome,
  ProductSpec,
  ResultJudgement,
  SweepAnalysis,
  Verdict,
} from '../analysis.types.js';
import { withBuiltInLimit } from './built-in-limit.js';
import { judgeMeasure } from './judge-measure.js';
import { describeMeasure } from './measure-names.js';

export interface ResultToJudge {
  analysis: SweepAnalysis;
  outcome: Outcome;
  /** The limits released and in force at `startedAt`; null when there are none. */
  limits: readonly Limit[] | null;
  product: ProductSpec;
}

/**
 * Judges a result: every measure against its limit, and from these the verdict.
 *
 * The verdict, in this order:
 *
 * 1. `aborted` when the station aborted: nothing is judged.
 * 2. `fail` when the station stopped on a fail, whatever else is known, with or without limits: a unit that a
 *    station took off must not travel on.
 * 3. `unjudged` when no limits are released. The built-in limit (complianceVoltage ≥ V_hi) belongs to judging and
 *    waits for a released set too; an empty released set is a set, and then the built-in limit judges alone.
 * 4. `fail` when any measure fails, else `notProven` when any is, else `pass`.
 *
 * A limit on a measure that the analysis did not produce is `notProven` with the reason `notMeasured`, so a limit
 * never goes unnoticed.
 *
 * @returns all measures of the analysis with their judgements, in the analysis' order, then those limited only;
 *   `failedMeasures` holds the names of those that failed
 * @example judgeResult({ analysis, outcome: 'completed', limits: [impedanceAtLeast10M], product }).verdict
 */
export function judgeResult({ analysis, outcome, limits, product }: ResultToJudge): ResultJudgement {
  const judged = limits !== null && outcome !== 'aborted';
  const measures = judged
    ? judgeMeasures(analysis, withBuiltInLimit(limits, product), product)
    : analysis.measures.map((measure) => judgeMeasure(measure, null, analysis, product));
  return {
    verdict: verdictOf(outcome, judged, measures),
    measures,
    failedMeasures: measures.filter(({ outcome }) => outcome === 'fail').map(({ name }) => name),
  };
}

function judgeMeasures(
  analysis: SweepAnalysis,
  limits: readonly Limit[],
  product: ProductSpec,
): MeasureJudgement[] {
  const present = new Set(analysis.measures.map(({ name }) => name));
  const absent = limits
    .filter(({ measure }) => !present.has(measure))
    .map(({ measure }) => notMeasured(measure));
  return [...analysis.measures, ...absent].map((measure) =>
    judgeMeasure(measure, limits.find((limit) => limit.measure === measure.name) ?? null, analysis, product),
  );
}

function notMeasured(name: MeasureName): Measure {
  return {
    name,
    unit: describeMeasure(name).unit,
    value: null,
    expandedUncertainty: null,
    low: null,
    high: null,
    bound: 'exact',
    reason: 'notMeasured',
  };
}

function verdictOf(outcome: Outcome, judged: boolean, measures: readonly MeasureJudgement[]): Verdict {
  if (outcome === 'aborted') return 'aborted';
  if (outcome === 'stoppedOnFail') return 'fail';
  if (!judged) return 'unjudged';
  if (measures.some((measure) => measure.outcome === 'fail')) return 'fail';
  return measures.some((measure) => measure.outcome === 'notProven') ? 'notProven' : 'pass';
}
