import type { MeasureLimit, Product, TestPlan } from '@/types/api';
import { figureText, percentText } from '@/utils/format-figure';
import { measureUnits } from './measure-units';

/** "at least 10 MΩ", "at most 0.5 %", "−1 % to 1 %". */
export function limitWords({
  measure,
  lower,
  upper,
}: Pick<MeasureLimit, 'measure' | 'lower' | 'upper'>): string {
  const unit = measureUnits[measure];
  if (lower !== null && upper !== null) return `${figureText(lower, unit)} to ${figureText(upper, unit)}`;
  if (lower !== null) return `at least ${figureText(lower, unit)}`;
  return upper === null ? 'no limit' : `at most ${figureText(upper, unit)}`;
}

/** What the rule and its guard factor mean for a unit near the limit. */
export function riskWords({ rule, guardFactor, guardedRisk }: MeasureLimit): string {
  const guarded = `passes when inside by at least ${guardFactor} × U; a unit just outside a limit then passes with a risk of at most ${percentText(guardedRisk)}`;
  if (rule === 'guarded') return `It ${guarded}. In between: not proven.`;
  return `Decided at the limit itself while U is at most a third of what the limit allows; a unit just outside may then pass with a risk of up to 50 %. With a larger U it ${guarded}.`;
}

const kinds: Record<Product['circuitKind'], string> = {
  twoTransistorMirror: 'two-transistor mirror',
  wilsonMirror: 'Wilson mirror',
  cascode: 'cascode',
  opAmpPassTransistor: 'op-amp with pass transistor',
  other: 'other',
};
export const circuitWords = (kind: Product['circuitKind']): string => kinds[kind];

/** The course of a plan in a sentence. */
export function planWords({ loadVolts, referenceVolts, dwellMs, repeatFirst, upAndDown }: TestPlan): string {
  const from = Math.min(...loadVolts);
  const to = Math.max(...loadVolts);
  const course = upAndDown ? 'up and down again' : 'up';
  const repeat = repeatFirst ? ', the first one repeated at the end' : '';
  return `${loadVolts.length} load steps from ${figureText(from, 'V')} to ${figureText(to, 'V')}, ${course}${repeat}; ${figureText(dwellMs / 1000, 's')} each; reference at ${figureText(referenceVolts, 'V')}.`;
}
