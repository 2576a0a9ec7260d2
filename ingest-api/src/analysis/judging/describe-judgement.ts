import type { Limit, MeasureJudgement } from '../analysis.types.js';
import { formatBound, formatFigure, formatInterval, formatWithUncertainty } from './format-figure.js';
import { describeMeasure, IMPEDANCE_MEASURES } from './measure-names.js';

/** Probabilities beyond these are written as "over" and "below": more digits would claim too much of the tails. */
const NEARLY_CERTAIN = 0.999;
const NEARLY_IMPOSSIBLE = 0.001;

/** What the reasons say in words; an unknown reason is quoted as it stands. */
const REASONS: ReadonlyMap<string, string> = new Map([
  ['notMeasured', 'it was not measured'],
  ['notComputed', 'it could not be computed'],
  ['notApplicable', 'it does not apply to this circuit'],
  ['fewPoints', 'too few points to tell'],
  ['noCurrent', 'no point carries a tenth of the nominal current'],
  ['rangeNotCovered', 'the points do not cover the promised range'],
  ['uncertaintyUnknown', 'its uncertainty is not known'],
  ['risingCurrent', 'the current rises with the load voltage'],
]);

/**
 * One plain sentence about a measure and its judging, for the unit page, mails and the API.
 *
 * Figures carry SI prefixes and the digits that their uncertainty bears; bounds are called "at least" or
 * "at most" and rounded to the safe side.
 *
 * @example 'Output impedance is 12.14 MΩ (11.85 to 12.44 MΩ); at least 10 MΩ is required, so it passes
 *   (probability of conformity over 99.9 %).'
 */
export function describeJudgement(measure: MeasureJudgement): string {
  const finding = describeFinding(measure);
  if (measure.outcome === null || measure.limit === null) return `${finding}; nothing limits it.`;
  return `${finding}; ${describeLimit(measure.limit, measure.unit)}, ${describeOutcome(measure)}.`;
}

/** The measured figure: a clause without full stop, e.g. `Setpoint error is 0.376 ± 0.021 %`. */
function describeFinding(measure: MeasureJudgement): string {
  const { label } = describeMeasure(measure.name);
  if (measure.value === null) return `${label} has no value: ${inWords(measure.reason ?? 'notMeasured')}`;
  return `${label} is ${describeValue(measure, measure.value)}`;
}

function describeValue(measure: MeasureJudgement, value: number): string {
  const { name, unit, bound, low, high, expandedUncertainty } = measure;
  if (bound !== 'exact') return formatBound(value, unit, bound);
  // The interval of what goes with 1/g is lopsided: it is told by its ends.
  if (low !== null && high !== null && IMPEDANCE_MEASURES.has(name)) {
    return `${formatFigure(value, unit, Math.abs(high - low) / 2)} (${formatInterval(low, high, unit)})`;
  }
  return formatWithUncertainty(value, unit, expandedUncertainty);
}

function describeLimit({ lower, upper }: Limit, unit: string): string {
  if (lower !== null && upper !== null) {
    return `from ${formatFigure(lower, unit)} to ${formatFigure(upper, unit)} is required`;
  }
  if (lower !== null) return `at least ${formatFigure(lower, unit)} is required`;
  return `at most ${formatFigure(upper ?? 0, unit)} is allowed`;
}

function describeOutcome({ outcome, reason, value, probabilityOfConformity }: MeasureJudgement): string {
  const probability = describeProbability(probabilityOfConformity);
  if (outcome === 'pass') return `so it passes${probability}`;
  if (outcome === 'fail') {
    const because = reason === 'noCurrent' ? `: ${inWords(reason)}` : '';
    return `so it fails${because}${probability}`;
  }
  if (value === null) return 'so it is not proven';
  if (reason === null || reason === 'guardBand')
    return `which this measurement can neither prove nor rule out${probability}`;
  return `which is not proven: ${inWords(reason)}`;
}

function describeProbability(probability: number | null): string {
  if (probability === null) return '';
  if (probability > NEARLY_CERTAIN) return ' (probability of conformity over 99.9 %)';
  if (probability < NEARLY_IMPOSSIBLE) return ' (probability of conformity below 0.1 %)';
  return ` (probability of conformity ${Number((100 * probability).toPrecision(3))} %)`;
}

/** `notComputed: fewer than 3 voltages` → `fewer than 3 voltages`. */
function inWords(reason: string): string {
  const detail = reason.split(': ').at(-1) ?? reason;
  return REASONS.get(detail) ?? detail;
}
