import type { AnalysisFlag, ComplianceFinding, PreparedPoint, ProductSpec } from '../analysis.types.js';
import { promisedSpan } from './same-voltage.js';
import type { SweepFindings } from './sweep-findings.js';

/** A slope is judged only when the points cover this share of the promised range. */
const COVERED_SHARE = 0.95;

/** A line through fewer load steps than this is drawn, but flagged. */
const FEW_STEPS = 5;

export interface FlagEvidence {
  findings: SweepFindings;
  points: readonly PreparedPoint[];
  steps: number;
  resolutionAssumed: boolean;
  rangeChanged: boolean;
  weightsUnused: boolean;
}

/** What a reader of the result should know about how it came about, in a fixed order. */
export function findFlags(evidence: FlagEvidence): AnalysisFlag[] {
  const { findings, points, steps } = evidence;
  const { impedance, curvature, compliance, repeated, fit, input } = findings;
  const raised: Record<AnalysisFlag, boolean> = {
    complianceShort: isShort(compliance.finding, input.product),
    curved: curvature?.curved ?? false,
    fewPoints: steps < FEW_STEPS,
    resolutionAssumed: evidence.resolutionAssumed,
    driftUnknown: fit !== null && repeated === null,
    risingCurrent: impedance !== null && impedance.lowOhms === null,
    rangeChanged: evidence.rangeChanged,
    rangeNotCovered: !coversRange(evidence.rangeChanged ? findings.fitted : findings.usable, input.product),
    overload: points.some((point) => point.overload),
    weightsUnused: evidence.weightsUnused,
  };
  return (Object.keys(raised) as AnalysisFlag[]).filter((flag) => raised[flag]);
}

function isShort({ complianceVolts, bound, reason }: ComplianceFinding, product: ProductSpec): boolean {
  if (reason === 'noCurrent') return true;
  return complianceVolts !== null && bound !== 'atLeast' && complianceVolts < product.complianceHighVolts;
}

function coversRange(points: readonly PreparedPoint[], product: ProductSpec): boolean {
  const inRange = points.filter((point) => point.inRange);
  const lowest = inRange[0];
  const highest = inRange.at(-1);
  if (lowest === undefined || highest === undefined) return false;
  const from = Math.max(lowest.loadVolts, product.complianceLowVolts);
  const to = Math.min(highest.loadVolts, product.complianceHighVolts);
  return to - from >= COVERED_SHARE * promisedSpan(product);
}
