import type {
  Limit,
  Measure,
  MeasureJudgement,
  MeasureName,
  OutputImpedance,
  Outcome,
  ProductSpec,
  ResultJudgement,
  SweepAnalysis,
  Verdict,
} from '../analysis.types.js';
import { judgeResult } from './judge-result.js';

/** Fixed values for specs; every call is a fresh object. */
export function aProduct(overrides: Partial<ProductSpec> = {}): ProductSpec {
  return {
    nominalAmps: 500e-6,
    supplyVolts: 9,
    complianceLowVolts: 0,
    complianceHighVolts: 8,
    complianceTolerance: 0.01,
    circuitKind: 'wilsonMirror',
    hasEmitterResistors: false,
    ...overrides,
  };
}

export function aMeasure(overrides: Partial<Measure> = {}): Measure {
  return {
    name: 'setpointError',
    unit: '%',
    value: 0.4,
    expandedUncertainty: 0.02,
    low: 0.38,
    high: 0.42,
    bound: 'exact',
    reason: null,
    ...overrides,
  };
}

export function aComplianceMeasure(overrides: Partial<Measure> = {}): Measure {
  return aMeasure({
    name: 'complianceVoltage',
    unit: 'V',
    value: 8,
    expandedUncertainty: null,
    low: 8,
    high: null,
    bound: 'atLeast',
    ...overrides,
  });
}

/** An impedance and its measure from ĝ and U, as the analysis states them. */
export function anImpedance(conductance: number, uncertainty: number): OutputImpedance {
  const low = 1 / (Math.abs(conductance) + uncertainty);
  const exact = conductance - uncertainty > 0;
  return {
    estimateOhms: conductance === 0 ? null : 1 / conductance,
    lowOhms: low,
    highOhms: exact ? 1 / (conductance - uncertainty) : null,
    bound: exact ? 'exact' : 'atLeast',
    conductanceSiemens: conductance,
    expandedUncertaintySiemens: uncertainty,
  };
}

export function anImpedanceMeasure(impedance: OutputImpedance): Measure {
  const exact = impedance.bound === 'exact';
  return aMeasure({
    name: 'outputImpedance',
    unit: 'Ω',
    value: exact ? impedance.estimateOhms : impedance.lowOhms,
    expandedUncertainty: null,
    low: impedance.lowOhms,
    high: impedance.highOhms,
    bound: impedance.bound,
  });
}

/** A good unit: 12.1 MΩ, tested over the promised 0 to 8 V, no loss of current seen. */
export function anAnalysis(overrides: Partial<SweepAnalysis> = {}): SweepAnalysis {
  const impedance = overrides.impedance ?? anImpedance(82.4e-9, 2e-9);
  return {
    points: [0, 4, 8].map((loadVolts, index) => ({
      index,
      loadVolts,
      outputAmps: 500e-6,
      direction: null,
      elapsedMs: null,
      outputAmpsStdDev: null,
      overload: false,
      rangeAmps: null,
      inFit: true,
      inRange: true,
    })),
    fit: {
      interceptAmps: 500e-6,
      slopeSiemens: -impedance.conductanceSiemens,
      interceptStdError: 1e-9,
      slopeStdError: 1e-9,
      correlation: -0.8,
      residualStdDev: 5e-9,
      rSquared: 0.99,
      degreesOfFreedom: 1,
      largestResidualAmps: 5e-9,
      pointCount: 3,
      meanVolts: 4,
      sxx: 32,
      weighted: false,
    },
    compliance: { kneeFound: false, complianceVolts: 8, bound: 'atLeast', fitHighVolts: 8, reason: null },
    slopeUncertainty: null,
    impedance,
    measures: [anImpedanceMeasure(impedance), aMeasure(), aComplianceMeasure()],
    flags: [],
    ...overrides,
  };
}

export function aLimit(overrides: Partial<Limit> = {}): Limit {
  return {
    measure: 'outputImpedance',
    lower: 10e6,
    upper: null,
    rule: 'guarded',
    guardFactor: 1,
    ...overrides,
  };
}

/** A sweep whose conductance is ĝ ± U, in nS, with any measures besides impedance and compliance. */
export function withSlope(conductance: number, uncertainty: number, ...measures: Measure[]): SweepAnalysis {
  const impedance = anImpedance(conductance * 1e-9, uncertainty * 1e-9);
  return anAnalysis({
    impedance,
    measures: [anImpedanceMeasure(impedance), ...measures, aComplianceMeasure()],
  });
}

/** The judgement of one measure out of a result's. */
export function judgementOf(measures: readonly MeasureJudgement[], name: MeasureName): MeasureJudgement {
  const found = measures.find((measure) => measure.name === name);
  if (found === undefined) throw new Error(`no measure ${name}`);
  return found;
}

/** Judges as a result of the usual product. */
export function judge(
  analysis: SweepAnalysis,
  limits: readonly Limit[] | null,
  outcome: Outcome = 'completed',
): ResultJudgement {
  return judgeResult({ analysis, outcome, limits, product: aProduct() });
}

/** Verdicts from worst to best, for comparisons. */
export const RANK: Readonly<Record<Verdict, number>> = {
  fail: 0,
  notProven: 1,
  pass: 2,
  unjudged: NaN,
  aborted: NaN,
};
