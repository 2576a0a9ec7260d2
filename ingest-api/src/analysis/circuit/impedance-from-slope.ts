import { tFactor } from '../distributions/student-t.js';

export interface FirstOrderImpedance {
  /** r = −dV/dI = −1/b in Ω; negative when the current rises with the load voltage. */
  ohms: number;
  /** u(r) = u(b)/b² in Ω. */
  standardUncertainty: number;
  relativeUncertainty: number;
  /** t_{0.95}(ν)·u(r) in Ω. */
  expandedUncertainty: number;
}

/**
 * Output impedance and its uncertainty to first order, `r = −1/b`, `u(r) = u(b)/b²`.
 *
 * Good where u(b) is a small part of b. Where it is not, the interval of r is lopsided or open to infinity, and
 * what is displayed is the interval of the conductance turned over instead.
 *
 * @param slopeSiemens - b = dI/dV in S, not 0
 * @param slopeStdError - u(b) in S
 * @param degreesOfFreedom - of u(b)
 * @throws RangeError when the slope is 0: there is no impedance, only a bound
 * @see JCGM 100:2008 (GUM), 5.1.2 equation (10)
 */
export function impedanceFromSlope(
  slopeSiemens: number,
  slopeStdError: number,
  degreesOfFreedom: number,
): FirstOrderImpedance {
  if (slopeSiemens === 0) throw new RangeError('impedanceFromSlope requires a slope other than 0');
  const ohms = -1 / slopeSiemens;
  const standardUncertainty = slopeStdError / slopeSiemens ** 2;
  return {
    ohms,
    standardUncertainty,
    relativeUncertainty: standardUncertainty / Math.abs(ohms),
    expandedUncertainty: tFactor(0.95, degreesOfFreedom) * standardUncertainty,
  };
}
