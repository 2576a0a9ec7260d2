import type { MeasureJudgement, MeasureName, Bound, Outcome, Verdict } from '../analysis/analysis.types.js';
import type { AnsweredMeasure, CodedText, RunKind } from './result.types.js';

/** A computed and judged post on its way into the database; what depends on other rows is still open. */
export interface PreparedResult {
  resultUuid: string;
  canonicalSha256: string;
  /** The post as received, gzipped. */
  body: Buffer;
  stationId: number;
  apiKeyId: number | null;
  productId: number;
  partNumber: string;
  stageId: number;
  stage: string;
  serialNumber: string;
  lot: string | null;
  runKind: RunKind;
  outcome: Outcome;
  counted: boolean;
  verdict: Verdict;
  startedAt: number;
  finishedAt: number | null;
  sentAt: number | null;
  receivedAt: number;
  fixture: string | null;
  programName: string | null;
  programVersion: string | null;
  seeded: boolean;
  conductanceSiemens: number | null;
  conductanceUncertainty: number | null;
  limitSiemens: number | null;
  impedanceOhms: number | null;
  impedanceBound: Bound;
  referenceAmps: number | null;
  failedMeasures: MeasureName[];
  flags: string[];
  judgement: MeasureJudgement[];
  /** What the answer needs besides. */
  maxAttempts: number;
  priorStageId: number | null;
  nextStage: string | null;
  testPlanVersion: number | null;
  limitSetVersion: number | null;
  measures: AnsweredMeasure[];
  warnings: CodedText[];
}
