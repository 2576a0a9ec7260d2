const names: Record<string, string> = {
  referenceCurrent: 'reference current',
  setpointError: 'setpoint error',
  outputImpedance: 'output impedance',
  relativeSlope: 'relative slope',
  loadRegulation: 'load regulation',
  complianceVoltage: 'compliance voltage',
  linearityError: 'linearity error',
  settlingDrift: 'settling drift',
  sweepHysteresis: 'sweep hysteresis',
  impedanceCurrentProduct: 'impedance–current product',
  effectiveEarlyVoltage: 'effective Early voltage',
};

/** A measure's name in a sentence; an unknown one as the API calls it. */
export const measureName = (measure: string): string => names[measure] ?? measure;

/** Every measure by the API's name, in the order in which a sheet lists them. */
export const measures = Object.keys(names);
