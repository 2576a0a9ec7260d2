import type { MeasureLimit } from '@/types/api';

/** The unit in which a measure's limits are stated. */
export const measureUnits: Record<MeasureLimit['measure'], string> = {
  referenceCurrent: 'A',
  setpointError: '%',
  outputImpedance: 'Ω',
  relativeSlope: 'ppm/V',
  loadRegulation: '%',
  complianceVoltage: 'V',
  linearityError: 'ppm',
  settlingDrift: 'ppm',
  sweepHysteresis: 'ppm',
  impedanceCurrentProduct: 'V',
  effectiveEarlyVoltage: 'V',
};
