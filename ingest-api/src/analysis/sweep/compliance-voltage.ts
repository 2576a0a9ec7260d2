import type { Measure } from '../analysis.types.js';
import { absentMeasure, boundMeasure, exactMeasure } from './measure.js';
import { differenceUncertainty, type SweepFindings } from './sweep-findings.js';

/**
 * `complianceVoltage` (V): the load voltage at which the current falls out of tolerance; *at least* the highest
 * tested one when it never does, *at most* the lowest one when it was out from the beginning.
 *
 * The uncertainty of a crossing is that of the two currents (max(1.2·δ, t·s·√2)) times the volts the crossing
 * moves per ampere, and never more than the load step it lies in.
 */
export function complianceVoltage(findings: SweepFindings): Measure {
  const { finding, crossing } = findings.compliance;
  if (finding.complianceVolts === null) {
    return absentMeasure(
      'complianceVoltage',
      finding.reason === 'fewPoints' ? 'notMeasured: fewPoints' : 'notMeasured',
    );
  }
  if (finding.bound === 'atLeast')
    return boundMeasure('complianceVoltage', 'atLeast', finding.complianceVolts);
  if (crossing === null) return boundMeasure('complianceVoltage', 'atMost', finding.complianceVolts, 0);
  const uncertainty = Math.min(crossing.stepVolts, crossing.voltsPerAmp * differenceUncertainty(findings));
  return exactMeasure('complianceVoltage', crossing.volts, uncertainty);
}
