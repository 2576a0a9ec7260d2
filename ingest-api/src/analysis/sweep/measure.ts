import type { Measure, MeasureName } from '../analysis.types.js';
import { describeMeasure } from '../judging/measure-names.js';

/** A measure with value ± U; figures beyond the range of numbers make it an absent one. */
export function exactMeasure(name: MeasureName, value: number, expandedUncertainty: number): Measure {
  if (!Number.isFinite(value) || !Number.isFinite(expandedUncertainty)) {
    return absentMeasure(name, 'notComputed: beyond the range of numbers');
  }
  return {
    name,
    unit: describeMeasure(name).unit,
    value,
    expandedUncertainty,
    low: value - expandedUncertainty,
    high: value + expandedUncertainty,
    bound: 'exact',
    reason: null,
  };
}

/** A measure of which only one end is known: its value is that end. */
export function boundMeasure(
  name: MeasureName,
  bound: 'atLeast' | 'atMost',
  value: number,
  expandedUncertainty: number | null = null,
): Measure {
  return {
    name,
    unit: describeMeasure(name).unit,
    value,
    expandedUncertainty,
    low: bound === 'atLeast' ? value : null,
    high: bound === 'atMost' ? value : null,
    bound,
    reason: null,
  };
}

/** A measure without value, and why. */
export function absentMeasure(name: MeasureName, reason: string): Measure {
  return {
    name,
    unit: describeMeasure(name).unit,
    value: null,
    expandedUncertainty: null,
    low: null,
    high: null,
    bound: 'exact',
    reason,
  };
}
