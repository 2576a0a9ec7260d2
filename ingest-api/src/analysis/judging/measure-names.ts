import type { MeasureName } from '../analysis.types.js';

export interface MeasureDescription {
  /** As it stands at the beginning of a sentence or in a table. */
  label: string;
  /** Unit of its value, in which its limits are stated too. */
  unit: string;
}

const DESCRIPTIONS: Record<MeasureName, MeasureDescription> = {
  referenceCurrent: { label: 'Reference current', unit: 'A' },
  setpointError: { label: 'Setpoint error', unit: '%' },
  outputImpedance: { label: 'Output impedance', unit: 'Ω' },
  relativeSlope: { label: 'Relative slope', unit: 'ppm/V' },
  loadRegulation: { label: 'Load regulation', unit: '%' },
  complianceVoltage: { label: 'Compliance voltage', unit: 'V' },
  linearityError: { label: 'Linearity error', unit: 'ppm' },
  settlingDrift: { label: 'Settling drift', unit: 'ppm' },
  sweepHysteresis: { label: 'Sweep hysteresis', unit: 'ppm' },
  impedanceCurrentProduct: { label: 'Impedance × current', unit: 'V' },
  effectiveEarlyVoltage: { label: 'Effective Early voltage', unit: 'V' },
};

/** Every measure's name, in the order in which they are shown. */
export const MEASURE_NAMES = Object.keys(DESCRIPTIONS) as MeasureName[];

/** Label and unit of a measure. */
export function describeMeasure(name: MeasureName): MeasureDescription {
  return DESCRIPTIONS[name];
}

/** The measures of the form (intercept current ·) 1/g (− offset), judged in conductance. */
export const IMPEDANCE_MEASURES: ReadonlySet<MeasureName> = new Set([
  'outputImpedance',
  'impedanceCurrentProduct',
  'effectiveEarlyVoltage',
]);
