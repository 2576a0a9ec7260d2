import type { LineFit, Measure, PreparedPoint, SweepAnalysis, SweepInput } from '../analysis.types.js';
import { outputImpedance } from '../uncertainty/output-impedance.js';
import { slopeUncertainty, type SlopeReadings } from '../uncertainty/slope-uncertainty.js';
import { chooseFitPoints } from './choose-fit-points.js';
import { complianceVoltage } from './compliance-voltage.js';
import { findCurvature } from './curvature.js';
import { findCompliance } from './find-compliance.js';
import { driftAmps, findRepeatedPoint } from './find-drift.js';
import { findFlags, type FlagEvidence } from './find-flags.js';
import { linearityError } from './linearity-error.js';
import { fitAndLevel, levelUncertainty } from './level-ranges.js';
import { loadRegulation } from './load-regulation.js';
import { preparePoints, usableByVoltage } from './prepare-points.js';
import { referenceCurrent, relativeTo, setpointError } from './reference-current.js';
import { resolveResolution } from './resolve-resolution.js';
import { endTolerance, sameVoltageWithin } from './same-voltage.js';
import { settlingDrift } from './settling-drift.js';
import { slopeMeasures } from './slope-measures.js';
import type { SweepFindings } from './sweep-findings.js';
import { sweepHysteresis } from './sweep-hysteresis.js';

/**
 * Computes everything Ampkeep knows about one sweep: points brought to the output terminals, compliance and knee,
 * the fitted line, the slope's uncertainty, output impedance and all measures, in SI units.
 *
 * Whatever was measured gives an answer: dead, open, shorted, overloaded, single-voltage or empty sweeps have
 * findings and reasons, never a NaN, an infinity or an exception. The result depends neither on the order of the
 * points (unless it is their only clock) nor on anything but the input.
 *
 * Cost: quadratic in the number of points (500: a few milliseconds).
 */
export function analyseSweep(input: SweepInput): SweepAnalysis {
  const points = preparePoints(input);
  const evidence = investigate(input, points);
  const { findings } = evidence;
  return {
    points,
    fit: findings.fit,
    compliance: findings.compliance.finding,
    slopeUncertainty: findings.slopeUncertainty,
    impedance: findings.impedance,
    measures: measuresOf(findings),
    flags: findFlags(evidence),
  };
}

function investigate(input: SweepInput, points: readonly PreparedPoint[]): FlagEvidence {
  const { product, ammeter } = input;
  const sameVolts = sameVoltageWithin(product);
  const read = usableByVoltage(points);
  const readings = read.map((point) => input.points[point.index]!.outputAmps);
  const resolution = resolveResolution(readings, ammeter, product.nominalAmps);
  const compliance = findCompliance(read, product);
  const { ranges, rangeChanged } = chooseFitPoints(read, compliance.fitLimitVolts, sameVolts);
  const { usable, fitted, fit, steps, weightsUnused, rangesFit } = fitAndLevel(read, ranges, sameVolts);
  const findings: SweepFindings = {
    input,
    usable,
    fitted,
    ranges,
    levelAmps: 0,
    compliance,
    fit,
    curvature: fit === null ? null : findCurvature(fitted, fit, resolution.writtenStepAmps),
    slopeReason: slopeReason(fit, compliance.finding.reason),
    slopeUncertainty: null,
    impedance: null,
    repeated: findRepeatedPoint(usable, sameVolts),
    resolutionAmps: resolution.resolutionAmps,
    sameVolts,
    endVolts: endTolerance(product),
  };
  addImpedance(findings);
  if (rangesFit !== null) findings.levelAmps = levelUncertainty(rangesFit, findings.slopeUncertainty);
  return { findings, points, steps, resolutionAssumed: resolution.assumed, rangeChanged, weightsUnused };
}

function slopeReason(fit: LineFit | null, complianceReason: string | null): string | null {
  if (complianceReason === 'noCurrent') return 'notComputed: no current';
  return fit === null ? 'notComputed: fewer than 3 voltages' : null;
}

function addImpedance(findings: SweepFindings): void {
  const { fit, fitted, repeated, input } = findings;
  if (fit === null || findings.slopeReason !== null) return;
  findings.slopeUncertainty = slopeUncertainty({
    fit,
    volts: fitted.map((point) => point.loadVolts),
    amps: fitted.map((point) => point.outputAmps),
    ranges: findings.ranges.length > 1 ? findings.ranges.map(({ points }) => readingsOf(points)) : undefined,
    sameVolts: findings.sameVolts,
    resolutionAmps: findings.resolutionAmps,
    readingAccuracyPercent: input.ammeter.readingAccuracyPercent ?? 0,
    driftAmps: repeated === null ? null : driftAmps(repeated, fit.slopeSiemens),
  });
  findings.impedance = outputImpedance(fit.slopeSiemens, findings.slopeUncertainty.expanded);
}

function readingsOf(points: readonly PreparedPoint[]): SlopeReadings {
  return {
    volts: points.map((point) => point.loadVolts),
    amps: points.map((point) => point.outputAmps),
  };
}

function measuresOf(findings: SweepFindings): Measure[] {
  const reference = referenceCurrent(findings);
  const relativeAmps = relativeTo(reference, findings);
  const [impedance, relativeSlope, product, earlyVoltage] = slopeMeasures(findings, relativeAmps);
  return [
    reference,
    setpointError(reference, findings.input.product.nominalAmps),
    impedance,
    relativeSlope,
    loadRegulation(findings, relativeAmps),
    complianceVoltage(findings),
    linearityError(findings, relativeAmps),
    settlingDrift(findings, relativeAmps),
    sweepHysteresis(findings, relativeAmps),
    product,
    earlyVoltage,
  ];
}
