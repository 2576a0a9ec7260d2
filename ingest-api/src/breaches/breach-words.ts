import type { Limit, MeasureJudgement } from '../analysis/analysis.types.js';
import { describeJudgement } from '../analysis/judging/describe-judgement.js';
import { formatBound, formatFigure } from '../analysis/judging/format-figure.js';
import { describeMeasure } from '../analysis/judging/measure-names.js';
import type { BreachMeasure } from './models/breach.model.js';

/** The enough-for-a-subject precision of a figure whose uncertainty isn't told with it. */
const SHORT_DIGITS = 4;

const STOPPED_TEXT = 'The station stopped the test on a fail.';

/** Names a breach in lists, e.g. `Output impedance out of limits: FH-R500-W at final`. */
export function breachTitle(measure: BreachMeasure, partNumber: string, stage: string): string {
  const what =
    measure === 'stoppedOnFail' ? 'Stopped on a fail' : `${describeMeasure(measure).label} out of limits`;
  return `${what}: ${partNumber} at ${stage}`;
}

/** The judging of the broken measure as one sentence. */
export function breachEventText(judgement: MeasureJudgement | null): string {
  return judgement === null ? STOPPED_TEXT : describeJudgement(judgement);
}

/**
 * How bad it is, for a mail's subject.
 * @example 'output impedance 3.104 MΩ, at least 5 MΩ required'
 */
export function howBad(judgement: MeasureJudgement | null): string {
  if (judgement === null) return 'stopped on a fail';
  const { name, unit, value, bound, limit } = judgement;
  const label = describeMeasure(name).label.toLowerCase();
  if (value === null) return `${label} without a value`;
  const figure = bound === 'exact' ? shortFigure(value, unit) : formatBound(value, unit, bound);
  return limit === null ? `${label} ${figure}` : `${label} ${figure}, ${limitWords(limit, unit)}`;
}

function limitWords({ lower, upper }: Limit, unit: string): string {
  if (lower !== null && upper !== null)
    return `${formatFigure(lower, unit)} to ${formatFigure(upper, unit)} required`;
  if (lower !== null) return `at least ${formatFigure(lower, unit)} required`;
  return upper === null ? 'no limit' : `at most ${formatFigure(upper, unit)} allowed`;
}

const shortFigure = (value: number, unit: string): string =>
  formatFigure(Number(value.toPrecision(SHORT_DIGITS)), unit);
