import type { Measure, MeasureName, OutputImpedance, SlopeUncertainty } from '../analysis.types.js';
import { absentMeasure, boundMeasure, exactMeasure } from './measure.js';
import type { SweepFindings } from './sweep-findings.js';

const NO_CURRENT = 'notComputed: no current';

/** outputImpedance, relativeSlope, impedanceCurrentProduct, effectiveEarlyVoltage. */
export type SlopeMeasures = [Measure, Measure, Measure, Measure];

/** The measures that are made of the fitted slope, all absent for the same reason when there is none. */
export function slopeMeasures(findings: SweepFindings, relativeAmps: number | null): SlopeMeasures {
  const { fit, impedance, slopeUncertainty, slopeReason, input } = findings;
  if (fit === null || impedance === null || slopeUncertainty === null) {
    const reason = slopeReason ?? 'notComputed';
    return [
      absentMeasure('outputImpedance', reason),
      absentMeasure('relativeSlope', reason),
      absentMeasure('impedanceCurrentProduct', reason),
      absentMeasure('effectiveEarlyVoltage', reason),
    ];
  }
  return [
    impedanceTimes('outputImpedance', impedance, 1, 0),
    relativeSlope(impedance, slopeUncertainty, relativeAmps),
    impedanceCurrentProduct(impedance, fit.interceptAmps),
    effectiveEarlyVoltage(impedance, fit.interceptAmps, input),
  ];
}

/**
 * `relativeSlope` (ppm/V): 10⁶·ĝ/I_ref, positive when the current falls. Unlike an impedance it always has a
 * value and a symmetric uncertainty, 10⁶·U/I_ref (the current's own uncertainty is parts per thousand of it), so
 * charts and capability use it.
 */
function relativeSlope(
  impedance: OutputImpedance,
  slopeUncertainty: SlopeUncertainty,
  relativeAmps: number | null,
): Measure {
  if (relativeAmps === null) return absentMeasure('relativeSlope', NO_CURRENT);
  const value = (1e6 * impedance.conductanceSiemens) / relativeAmps;
  return exactMeasure('relativeSlope', value, (1e6 * slopeUncertainty.expanded) / relativeAmps);
}

/** `impedanceCurrentProduct` (V): a·r_out, the voltage at which the extended line would carry no current. */
function impedanceCurrentProduct(impedance: OutputImpedance, interceptAmps: number): Measure {
  if (!(interceptAmps > 0)) return absentMeasure('impedanceCurrentProduct', NO_CURRENT);
  return impedanceTimes('impedanceCurrentProduct', impedance, interceptAmps, 0);
}

/**
 * `effectiveEarlyVoltage` (V): a·r_out − supply, for a plain two-transistor mirror without emitter resistors only.
 *
 * From I = I_S·(1 + V_CE/V_A) with V_CE = supply − V: a = I_S·(1 + supply/V_A), g = I_S/V_A. In the other
 * circuits feedback raises r_out and the figure would not describe a transistor: `notApplicable`.
 */
function effectiveEarlyVoltage(
  impedance: OutputImpedance,
  interceptAmps: number,
  { product }: SweepFindings['input'],
): Measure {
  if (product.circuitKind !== 'twoTransistorMirror' || product.hasEmitterResistors) {
    return absentMeasure('effectiveEarlyVoltage', 'notApplicable');
  }
  if (!(interceptAmps > 0)) return absentMeasure('effectiveEarlyVoltage', NO_CURRENT);
  return impedanceTimes('effectiveEarlyVoltage', impedance, interceptAmps, product.supplyVolts);
}

/**
 * factor·r_out − offset with the interval of r_out. The expanded uncertainty is the first-order factor·U/ĝ²
 * (JCGM 100:2008, 5.1.2); `low` and `high` are the exact, lopsided ends. Without an upper end the value is the
 * lower one, *at least*, and has no uncertainty. A rising current has no impedance.
 */
function impedanceTimes(
  name: MeasureName,
  impedance: OutputImpedance,
  factor: number,
  offset: number,
): Measure {
  const { estimateOhms, lowOhms, highOhms, conductanceSiemens, expandedUncertaintySiemens } = impedance;
  if (lowOhms === null) return absentMeasure(name, 'risingCurrent');
  if (highOhms === null || estimateOhms === null)
    return boundMeasure(name, 'atLeast', factor * lowOhms - offset);
  const uncertainty = (factor * expandedUncertaintySiemens) / conductanceSiemens ** 2;
  const measure = exactMeasure(name, factor * estimateOhms - offset, uncertainty);
  if (measure.value === null) return measure;
  return { ...measure, low: factor * lowOhms - offset, high: factor * highOhms - offset };
}
