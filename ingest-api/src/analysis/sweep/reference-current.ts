import type { LineFit, Measure } from '../analysis.types.js';
import { tQuantile } from '../distributions/student-t.js';
import { currentAt } from './current-at.js';
import { absentMeasure, exactMeasure } from './measure.js';
import { NO_CURRENT_SHARE } from './seed-line.js';
import type { SweepFindings } from './sweep-findings.js';

/**
 * `referenceCurrent` (A): the fitted current at the plan's reference voltage, which must lie among the fitted
 * points (2 % of the range allowed). Without a fit: the measured current there, interpolated.
 *
 * Formula: U² = (t(n−2)·s)²·(1/n + (V_ref−V̄)²/Sxx) + 4·[(reading%·I/√3)² + (range%·range/√3)² + δ²/12].
 * The specification limits are rectangular (JCGM 100:2008, 4.3.7), k = 2; without a fit the first term is
 * missing and the resolution counts as the bound 0.6·δ.
 */
export function referenceCurrent(findings: SweepFindings): Measure {
  const { fit, fitted, input, endVolts } = findings;
  const volts = input.plan.referenceVolts;
  const lowest = fitted[0]?.loadVolts ?? Infinity;
  const highest = fitted.at(-1)?.loadVolts ?? -Infinity;
  if (volts < lowest - endVolts || volts > highest + endVolts) {
    return absentMeasure('referenceCurrent', 'notMeasured: reference voltage outside the fitted points');
  }
  if (fit === null) return measuredCurrent(findings, volts);
  const amps = fit.interceptAmps + fit.slopeSiemens * volts;
  const fromMeter = meterUncertainty(findings, amps);
  const fromRounding = findings.resolutionAmps / Math.sqrt(3);
  return exactMeasure(
    'referenceCurrent',
    amps,
    Math.hypot(lineUncertainty(fit, volts), fromMeter, fromRounding),
  );
}

function measuredCurrent(findings: SweepFindings, volts: number): Measure {
  const amps = currentAt(findings.fitted, volts, findings.sameVolts, findings.endVolts);
  if (amps === null) return absentMeasure('referenceCurrent', 'notMeasured');
  const uncertainty = Math.hypot(meterUncertainty(findings, amps), 0.6 * findings.resolutionAmps);
  return exactMeasure('referenceCurrent', amps, uncertainty);
}

/** t·s·√(1/n + (V−V̄)²/Sxx): expanded uncertainty (A) of the fitted line at a voltage from its scatter alone. */
export function lineUncertainty(fit: LineFit, volts: number): number {
  const leverage = 1 / fit.pointCount + (volts - fit.meanVolts) ** 2 / fit.sxx;
  return tQuantile(0.975, fit.degreesOfFreedom) * fit.residualStdDev * Math.sqrt(leverage);
}

/** Expanded (k = 2) uncertainty of a reading from the ammeter's accuracy specification. */
function meterUncertainty({ input: { ammeter } }: SweepFindings, amps: number): number {
  const reading = ((ammeter.readingAccuracyPercent ?? 0) / 100) * amps;
  const range = ((ammeter.rangeAccuracyPercent ?? 0) / 100) * (ammeter.rangeAmps ?? 0);
  return (2 / Math.sqrt(3)) * Math.hypot(reading, range);
}

/**
 * `setpointError` (%): (I_ref − I_nominal)/I_nominal, signed. It has the reference current's uncertainty or its
 * reason for having none.
 */
export function setpointError(reference: Measure, nominalAmps: number): Measure {
  if (reference.value === null || reference.expandedUncertainty === null) {
    return absentMeasure('setpointError', reference.reason ?? 'notMeasured');
  }
  const percentPerAmp = 100 / nominalAmps;
  return exactMeasure(
    'setpointError',
    (reference.value - nominalAmps) * percentPerAmp,
    reference.expandedUncertainty * Math.abs(percentPerAmp),
  );
}

/**
 * The current (A) that relative measures are stated against: the reference current, or the fitted line at its
 * mean voltage where the reference voltage was not reached, or the mean reading. Null when it is below a tenth of
 * the nominal current: a share of nothing means nothing.
 */
export function relativeTo(reference: Measure, { fit, input, usable }: SweepFindings): number | null {
  const amps =
    reference.value ??
    (fit === null ? meanAmps(usable) : fit.interceptAmps + fit.slopeSiemens * fit.meanVolts);
  return amps >= NO_CURRENT_SHARE * input.product.nominalAmps && amps > 0 ? amps : null;
}

function meanAmps(points: SweepFindings['usable']): number {
  return points.reduce((sum, point) => sum + point.outputAmps, 0) / Math.max(1, points.length);
}
