import type {
  Limit,
  Measure,
  MeasureJudgement,
  MeasureName,
  ProductSpec,
  SweepAnalysis,
} from '../analysis.types.js';
import { decideConformity } from './decide-conformity.js';
import { judgedQuantity } from './judged-quantity.js';
import { IMPEDANCE_MEASURES } from './measure-names.js';

/** U must not exceed this share of the tolerance for the `simple` rule to stay simple. */
const USUAL_ADEQUACY_RATIO = 1 / 3;

/** What a sweep over part of the promised range says nothing about: the slope over all of it. */
const SLOPE_MEASURES: ReadonlySet<MeasureName> = new Set([...IMPEDANCE_MEASURES, 'relativeSlope']);

type Decision = Pick<MeasureJudgement, 'outcome' | 'probabilityOfConformity' | 'reason'>;

/**
 * Judges one measure of a sweep against its limit.
 *
 * In this order: a measure that nothing limits has outcome null; a sweep that does not cover the promised range
 * proves no slope (`rangeNotCovered`); a limited measure without value or without uncertainty is `notProven`
 * (`notMeasured`, `uncertaintyUnknown`, or the reason the analysis gave); otherwise the limit's rule decides.
 * A decision left open by the guard band has the reason `guardBand`.
 *
 * The compliance voltage has a rule of its own: without a point outside the tolerance only "at least the highest
 * tested" is known. That passes when the highest tested reaches the limit, or when the limit is no higher than the
 * promised range and the sweep counts as covering it (95 %); else it is `notProven`, never a fail. An output
 * without current holds it up to no voltage, so it fails (`noCurrent`), wherever it was tested and however flat its
 * characteristic is.
 *
 * @see ISO 14253-1 (guarded); JCGM 106:2012, clause 8 (decision rules)
 */
export function judgeMeasure(
  measure: Measure,
  limit: Limit | null,
  analysis: SweepAnalysis,
  product: ProductSpec,
): MeasureJudgement {
  if (limit === null || (limit.lower === null && limit.upper === null)) {
    return withDecision(measure, limit, {
      outcome: null,
      probabilityOfConformity: null,
      reason: measure.reason,
    });
  }
  return withDecision(measure, limit, decide(measure, limit, analysis, product));
}

/** Written out, because spreading eleven measures into new objects would take longer than the whole fit. */
function withDecision(measure: Measure, limit: Limit | null, decision: Decision): MeasureJudgement {
  return {
    name: measure.name,
    unit: measure.unit,
    value: measure.value,
    estimate: measure.estimate,
    expandedUncertainty: measure.expandedUncertainty,
    low: measure.low,
    high: measure.high,
    bound: measure.bound,
    reason: decision.reason,
    limit,
    outcome: decision.outcome,
    probabilityOfConformity: decision.probabilityOfConformity,
  };
}

function decide(measure: Measure, limit: Limit, analysis: SweepAnalysis, product: ProductSpec): Decision {
  if (measure.name === 'complianceVoltage') {
    const decision = decideCompliance(measure, limit, analysis, product);
    if (decision !== null) return decision;
  }
  if (SLOPE_MEASURES.has(measure.name) && analysis.flags.includes('rangeNotCovered')) {
    return open('rangeNotCovered');
  }
  const quantity = judgedQuantity(measure, limit, analysis, product);
  if (quantity === null) {
    return open(measure.reason ?? (measure.value === null ? 'notMeasured' : 'uncertaintyUnknown'));
  }
  const outcome = decideConformity({
    value: quantity.value,
    expandedUncertainty: quantity.expandedUncertainty,
    tolerance: quantity.tolerance,
    rule: limit.rule,
    guardFactor: limit.guardFactor,
    largestAdequateUncertainty: (limit.adequacyRatio ?? USUAL_ADEQUACY_RATIO) * quantity.toleranceWidth,
  });
  return {
    outcome,
    probabilityOfConformity: quantity.probabilityOfConformity,
    reason: outcome === 'notProven' ? 'guardBand' : measure.reason,
  };
}

/** Null when the compliance voltage is an ordinary value, to be judged like any other. */
function decideCompliance(
  measure: Measure,
  limit: Limit,
  analysis: SweepAnalysis,
  product: ProductSpec,
): Decision | null {
  if (analysis.compliance.reason === 'noCurrent') {
    return { outcome: 'fail', probabilityOfConformity: 0, reason: 'noCurrent' };
  }
  if (measure.value === null || measure.bound !== 'atLeast') return null;
  // The true value may lie anywhere above what was tested, so an upper limit stays open.
  if (limit.upper !== null) return open('guardBand');
  const required = limit.lower ?? 0;
  const covered = required <= product.complianceHighVolts && !analysis.flags.includes('rangeNotCovered');
  if (measure.value >= required || covered) {
    return { outcome: 'pass', probabilityOfConformity: null, reason: measure.reason };
  }
  return open('rangeNotCovered');
}

function open(reason: string): Decision {
  return { outcome: 'notProven', probabilityOfConformity: null, reason };
}
