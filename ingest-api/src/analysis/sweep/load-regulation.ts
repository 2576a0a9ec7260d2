import type { Measure } from '../analysis.types.js';
import { currentAt } from './current-at.js';
import { driftAmps } from './find-drift.js';
import { absentMeasure, exactMeasure } from './measure.js';
import { differenceUncertainty, type SweepFindings } from './sweep-findings.js';

/**
 * `loadRegulation` (%): (I(V_lo) − I(V_hi))/I_ref over the promised range, signed, positive when the current
 * falls. Each end is measured, not fitted: interpolated between the neighbouring load steps or taken from a step
 * within 2 % of the range, else `notMeasured`. It includes the loss beyond a knee.
 *
 * Formula: U² = U_diff² + (2·|ΔI|/√3)² over I_ref, U_diff = max(1.2·δ, t·s·√2), ΔI the drift if known.
 * The standard term for a supply with constant-current output is load effect.
 */
export function loadRegulation(findings: SweepFindings, relativeAmps: number | null): Measure {
  const { usable, input, sameVolts, endVolts, fit, repeated } = findings;
  const { complianceLowVolts, complianceHighVolts } = input.product;
  const atLow = currentAt(usable, complianceLowVolts, sameVolts, endVolts);
  const atHigh = currentAt(usable, complianceHighVolts, sameVolts, endVolts);
  if (atLow === null || atHigh === null) return absentMeasure('loadRegulation', 'notMeasured');
  if (relativeAmps === null) return absentMeasure('loadRegulation', 'notComputed: no current');
  const drift = repeated === null ? 0 : driftAmps(repeated, fit?.slopeSiemens ?? 0);
  const uncertainty = Math.hypot(differenceUncertainty(findings), (2 / Math.sqrt(3)) * drift);
  return exactMeasure(
    'loadRegulation',
    (100 * (atLow - atHigh)) / relativeAmps,
    (100 * uncertainty) / relativeAmps,
  );
}
