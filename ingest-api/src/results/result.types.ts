import type { RunKind } from '../analysis/yield/yield.types.js';
import type {
  Bound,
  Limit,
  MeasureJudgement,
  MeasureName,
  Outcome,
  PointDirection,
  Verdict,
} from '../analysis/analysis.types.js';

export type { RunKind };
export type Disposition = 'next' | 'retest' | 'retestElsewhere' | 'repair' | 'hold' | 'stop';

export interface PostedPoint {
  loadVolts: number;
  outputAmps: number;
  loadOhms?: number;
  elapsedMs?: number;
  direction?: PointDirection;
  outputAmpsStdDev?: number;
  ammeterRangeAmps?: number;
  overload?: boolean;
}

export interface PostedAmmeter {
  serialNumber?: string;
  rangeAmps?: number;
  resolutionAmps?: number;
  readingAccuracyPercent?: number;
  rangeAccuracyPercent?: number;
  burdenOhms?: number;
}

export interface PostedVoltmeter {
  serialNumber?: string;
  rangeVolts?: number;
  resolutionVolts?: number;
  readingAccuracyPercent?: number;
  rangeAccuracyPercent?: number;
  inputOhms?: number;
  spansAmmeter?: boolean;
}

/** A post that holds against result.schema.json, which stays the source of truth. */
export interface PostedResult {
  resultId: string;
  runKind?: RunKind;
  outcome: Outcome;
  abortReason?: string;
  study?: { id: string; trial: number; appraiser?: string; part?: string };
  partNumber: string;
  serialNumber: string;
  lot?: string;
  stage: string;
  channel?: string;
  startedAt: string;
  finishedAt?: string;
  sentAt?: string;
  testPlanVersion?: number;
  program?: { name: string; version?: string };
  operator?: string;
  fixture?: string;
  ambientCelsius?: number;
  unitCelsius?: number;
  humidityPercent?: number;
  dwellMs?: number;
  warmUpSeconds?: number;
  supplyVolts?: number;
  load?: { kind: 'resistor' | 'electronicLoad' | 'sourceMeter'; serialNumber?: string };
  fixtureLeakageOhms?: number;
  ammeter?: PostedAmmeter;
  voltmeter?: PostedVoltmeter;
  points: PostedPoint[];
  stationVerdict?: 'pass' | 'fail';
  routedOn?: 'hub' | 'station';
  notes?: string;
  extra?: Record<string, string | number | boolean | null>;
}

export interface CodedText {
  code: string;
  text: string;
}

export interface AnsweredMeasure {
  name: MeasureName;
  value: number | null;
  unit: string;
  expandedUncertainty: number | null;
  low: number | null;
  high: number | null;
  bound: Bound;
  limit: Pick<Limit, 'lower' | 'upper' | 'rule' | 'guardFactor'> | null;
  outcome: MeasureJudgement['outcome'];
  probabilityOfConformity: number | null;
  reason: string | null;
}

/** What `201` says, kept with the result so that a retry gets the very same. */
export interface ResultAnswer {
  resultId: string;
  receivedAt: string;
  verdict: Verdict;
  attempt: number | null;
  disposition: Disposition;
  nextStage: string | null;
  attemptsLeft: number | null;
  priorStagePassed: boolean | null;
  lotHeld: boolean;
  testPlanVersion: number | null;
  limitSetVersion: number | null;
  measures: AnsweredMeasure[];
  failedMeasures: MeasureName[];
  warnings: CodedText[];
  flags: string[];
  links: { self: string; unit: string };
}
