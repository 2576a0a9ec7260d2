import { createHash } from 'node:crypto';
import { gzipSync } from 'node:zlib';
import canonicalize from 'canonicalize';
import { neighbours } from '../products/catalogue.js';
import { type Evaluation, type EvaluationContext, limitSiemensOf } from './evaluate-post.js';
import type { PreparedResult } from './prepared-result.js';
import type { AnsweredMeasure, CodedText, PostedResult } from './result.types.js';

export interface Delivery {
  bytes: Buffer;
  post: PostedResult;
  stationId: number;
  apiKeyId: number | null;
  /** Demo history: opens breaches but sends no mail. */
  seeded: boolean;
}

/** Two posts are the same when their RFC 8785 canonical forms are. */
export const canonicalSha256 = (content: unknown): string =>
  createHash('sha256')
    .update(canonicalize(content) ?? '')
    .digest('hex');

/** Gathers everything about a judged post that its rows and its answer need. */
export function prepareResult(
  { bytes, post, stationId, apiKeyId, seeded }: Delivery,
  { product, stage, receivedAt }: EvaluationContext,
  { runKind, counted, plan, limitSet, analysis, judgement, flags }: Evaluation,
  warnings: CodedText[],
): PreparedResult {
  const { prior, next } = neighbours(product, stage);
  const referenceAmps =
    judgement.measures.find((measure) => measure.name === 'referenceCurrent')?.value ?? null;
  const impedance = judgement.measures.find((measure) => measure.name === 'outputImpedance');
  const timeOrNull = (text: string | undefined): number | null =>
    text === undefined ? null : Date.parse(text);
  return {
    resultUuid: post.resultId.toLowerCase(),
    canonicalSha256: canonicalSha256(post),
    body: gzipSync(bytes),
    stationId,
    apiKeyId,
    productId: product.productId,
    partNumber: product.partNumber,
    stageId: stage.stageId,
    stage: stage.name,
    serialNumber: post.serialNumber,
    lot: post.lot ?? null,
    runKind,
    outcome: post.outcome,
    counted,
    verdict: judgement.verdict,
    startedAt: Date.parse(post.startedAt),
    finishedAt: timeOrNull(post.finishedAt),
    sentAt: timeOrNull(post.sentAt),
    receivedAt,
    fixture: post.fixture ?? null,
    programName: post.program?.name ?? null,
    programVersion: post.program?.version ?? null,
    seeded,
    conductanceSiemens: analysis.impedance?.conductanceSiemens ?? null,
    conductanceUncertainty: analysis.impedance?.expandedUncertaintySiemens ?? null,
    limitSiemens: limitSiemensOf(limitSet?.limits ?? [], referenceAmps),
    impedanceOhms: impedance?.value ?? null,
    impedanceBound: impedance?.bound ?? 'exact',
    referenceAmps,
    failedMeasures: judgement.failedMeasures,
    flags,
    judgement: judgement.measures,
    maxAttempts: stage.maxAttempts,
    priorStageId: prior?.stageId ?? null,
    nextStage: next?.name ?? null,
    testPlanVersion: plan?.version ?? null,
    limitSetVersion: limitSet?.version ?? null,
    measures: judgement.measures.map(toAnswered),
    warnings,
  };
}

function toAnswered(measure: Evaluation['judgement']['measures'][number]): AnsweredMeasure {
  const {
    name,
    value,
    unit,
    expandedUncertainty,
    low,
    high,
    bound,
    limit,
    outcome,
    probabilityOfConformity,
    reason,
  } = measure;
  return {
    name,
    value,
    unit,
    expandedUncertainty,
    low,
    high,
    bound,
    limit:
      limit === null
        ? null
        : { lower: limit.lower, upper: limit.upper, rule: limit.rule, guardFactor: limit.guardFactor },
    outcome,
    probabilityOfConformity,
    reason,
  };
}
