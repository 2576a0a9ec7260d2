export type CircuitKind = 'twoTransistorMirror' | 'wilsonMirror' | 'cascode' | 'opAmpPassTransistor';
export type StageName = 'board' | 'final';
export type LimitedMeasure = 'outputImpedance' | 'setpointError' | 'loadRegulation';

export interface TestPlanFacts {
  version: number;
  loadVolts: readonly number[];
  referenceVolts: number;
  dwellMs: number;
  repeatFirst: boolean;
  upAndDown: boolean;
}

/** Ω for outputImpedance, % for setpointError and loadRegulation. */
export interface LimitFacts {
  measure: LimitedMeasure;
  lower: number | null;
  upper: number | null;
}

export interface StageFacts {
  stage: StageName;
  maxAttempts: number;
  yieldTarget: number;
  testPlan: TestPlanFacts;
  limits: readonly LimitFacts[];
}

/** Mean and spread (standard deviation) of what goes into a unit's circuit. */
export interface CircuitFacts {
  earlyVolts: number;
  earlyVoltsSpread: number;
  beta: number;
  betaSpread: number;
  /** Area mismatch of the pair, or error of the op-amp's reference, as a fraction. */
  mismatchSpread: number;
  setResistorSpread: number;
  /** Voltage across the sense resistor; only an op-amp circuit has one. */
  senseVolts: number;
}

export interface ProductFacts {
  partNumber: string;
  description: string;
  serialPrefix: string;
  nominalAmps: number;
  supplyVolts: number;
  complianceLowVolts: number;
  complianceHighVolts: number;
  /** As a fraction: 0.005 is 0.5 %. */
  complianceTolerance: number;
  direction: 'source' | 'sink';
  circuitKind: CircuitKind;
  hasEmitterResistors: boolean;
  ammeterRangeAmps: number;
  circuit: CircuitFacts;
  stages: readonly [StageFacts, ...StageFacts[]];
}
