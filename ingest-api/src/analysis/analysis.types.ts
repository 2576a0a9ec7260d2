/**
 * The words the computations share. Everything is in SI units (A, V, Ω, S, s) unless the name says
 * otherwise; instruments' accuracies are in percent because data sheets state them so.
 */

export type CircuitKind =
  'twoTransistorMirror' | 'wilsonMirror' | 'cascode' | 'opAmpPassTransistor' | 'other';
export type PointDirection = 'up' | 'down' | 'repeat';
export type Outcome = 'completed' | 'stoppedOnFail' | 'aborted';
export type Verdict = 'pass' | 'fail' | 'notProven' | 'unjudged' | 'aborted';
export type Bound = 'exact' | 'atLeast' | 'atMost';

export type MeasureName =
  | 'referenceCurrent'
  | 'setpointError'
  | 'outputImpedance'
  | 'relativeSlope'
  | 'loadRegulation'
  | 'complianceVoltage'
  | 'linearityError'
  | 'settlingDrift'
  | 'sweepHysteresis'
  | 'impedanceCurrentProduct'
  | 'effectiveEarlyVoltage';

export interface SweepPoint {
  loadVolts: number;
  outputAmps: number;
  loadOhms?: number;
  elapsedMs?: number;
  direction?: PointDirection;
  outputAmpsStdDev?: number;
  ammeterRangeAmps?: number;
  overload?: boolean;
}

/** What is known of the ammeter after post and register were merged. */
export interface AmmeterSpec {
  rangeAmps?: number;
  resolutionAmps?: number;
  readingAccuracyPercent?: number;
  rangeAccuracyPercent?: number;
  burdenOhms?: number;
}

export interface VoltmeterSpec {
  inputOhms?: number;
  /** True when the voltmeter's leads span load and ammeter together: then the burden is in `loadVolts` already. */
  spansAmmeter?: boolean;
}

export interface ProductSpec {
  nominalAmps: number;
  supplyVolts: number;
  complianceLowVolts: number;
  complianceHighVolts: number;
  /** τ as a fraction: 0.01 is 1 %. */
  complianceTolerance: number;
  circuitKind: CircuitKind;
  hasEmitterResistors: boolean;
}

export interface PlanSpec {
  referenceVolts: number;
}

export interface SweepInput {
  points: readonly SweepPoint[];
  ammeter: AmmeterSpec;
  voltmeter: VoltmeterSpec;
  fixtureLeakageOhms?: number;
  product: ProductSpec;
  plan: PlanSpec;
}

/** A point after burden and parallel paths were taken care of; `index` is its place in the post. */
export interface PreparedPoint {
  index: number;
  loadVolts: number;
  outputAmps: number;
  direction: PointDirection | null;
  elapsedMs: number | null;
  outputAmpsStdDev: number | null;
  /** The ammeter range it was read on; null when nobody said. */
  rangeAmps: number | null;
  overload: boolean;
  /** Whether the straight line was fitted through it. */
  inFit: boolean;
  /** In the plan's promised range. */
  inRange: boolean;
}

export interface LineFit {
  interceptAmps: number;
  /** b = dI/dV in S; g = −b. */
  slopeSiemens: number;
  interceptStdError: number;
  slopeStdError: number;
  /** Correlation of intercept and slope. */
  correlation: number;
  residualStdDev: number;
  rSquared: number;
  degreesOfFreedom: number;
  largestResidualAmps: number;
  /** Points that set the level of the line, and their mean voltage: those of the main ammeter range if several. */
  pointCount: number;
  meanVolts: number;
  /** Sum of squares of V (V²), centred within each ammeter range. */
  sxx: number;
  weighted: boolean;
}

export interface ComplianceFinding {
  kneeFound: boolean;
  /** Null when it could not be told (no usable point, or fewer than 4 for a seed line and one of them low). */
  complianceVolts: number | null;
  bound: Bound;
  /** The upper end of the fit set after a short compliance cut it. */
  fitHighVolts: number;
  reason: string | null;
}

/** All in S, all expanded (k ≈ 2) save `slopeStdError`. */
export interface SlopeUncertainty {
  expanded: number;
  fromScatter: number;
  fromResolution: number;
  fromGain: number;
  fromDrift: number;
  resolutionAmps: number;
}

export interface OutputImpedance {
  /** 1/ĝ, negative when the current rises; null only when the slope is exactly zero. */
  estimateOhms: number | null;
  /** Null when the current rises significantly (ĝ + U < 0): then there is no impedance. */
  lowOhms: number | null;
  /** Null when ĝ − U ≤ 0: no upper end exists. */
  highOhms: number | null;
  bound: Bound;
  conductanceSiemens: number;
  expandedUncertaintySiemens: number;
}

export interface Measure {
  name: MeasureName;
  unit: string;
  /** The figure to show: the estimate, or the bound when `bound` is not `exact`. */
  value: number | null;
  /** Given when `value` is a bound: the estimate it was drawn from, which judging compares with the limit. */
  estimate?: number;
  expandedUncertainty: number | null;
  low: number | null;
  high: number | null;
  bound: Bound;
  /** Why there is no value: `notComputed: fewer than 3 voltages`, `notMeasured`, … */
  reason: string | null;
}

export type AnalysisFlag =
  | 'complianceShort'
  | 'curved'
  | 'fewPoints'
  | 'resolutionAssumed'
  | 'driftUnknown'
  | 'risingCurrent'
  | 'rangeChanged'
  | 'rangeNotCovered'
  | 'overload'
  | 'weightsUnused';

export interface SweepAnalysis {
  points: PreparedPoint[];
  fit: LineFit | null;
  compliance: ComplianceFinding;
  slopeUncertainty: SlopeUncertainty | null;
  impedance: OutputImpedance | null;
  measures: Measure[];
  flags: AnalysisFlag[];
}

export type LimitRule = 'guarded' | 'simple';

export interface Limit {
  measure: MeasureName;
  lower: number | null;
  upper: number | null;
  rule: LimitRule;
  /** Guard band w = guardFactor · U; default 1. */
  guardFactor: number;
  /** Largest U, as a share of the tolerance (or of G), for which `simple` stays simple; default 1/3. */
  adequacyRatio?: number;
}

export interface MeasureJudgement extends Measure {
  limit: Limit | null;
  /** Null when nothing limits this measure. */
  outcome: 'pass' | 'fail' | 'notProven' | null;
  probabilityOfConformity: number | null;
}

export interface ResultJudgement {
  verdict: Verdict;
  measures: MeasureJudgement[];
  failedMeasures: MeasureName[];
}
