import type { SweepAnalysis } from '../analysis/analysis.types.js';
import { describeJudgement } from '../analysis/judging/describe-judgement.js';
import { describeMeasure } from '../analysis/judging/measure-names.js';
import { sweepLine } from '../analysis/sweep/sweep-line.js';
import type { CataloguePlan, CatalogueProduct } from '../products/catalogue.js';
import type {
  JudgedMeasureDto,
  ResultDetailDto,
  SweepDto,
  SweepFitDto,
  SweepLinePointDto,
} from './dto/result-detail.dto.js';
import type { RunItemDto } from './dto/run-item.dto.js';
import { describeFlags } from './flag-texts.js';
import type { Result } from './models/result.model.js';
import type { PostedResult } from './result.types.js';

interface DetailParts {
  item: RunItemDto;
  result: Result;
  post: PostedResult;
  analysis: SweepAnalysis;
  product: CatalogueProduct;
  plan: CataloguePlan | null;
}

const iso = (time: number | null): string | null => (time === null ? null : new Date(time).toISOString());

/** Everything the unit page shows of one result. */
export function toResultDetail(parts: DetailParts): ResultDetailDto {
  const { item, result, post } = parts;
  const { answer } = result;
  return {
    ...item,
    finishedAt: iso(result.finishedAt),
    sentAt: iso(result.sentAt),
    operator: post.operator ?? null,
    fixture: post.fixture ?? null,
    channel: post.channel ?? null,
    programName: post.program?.name ?? null,
    programVersion: post.program?.version ?? null,
    ambientCelsius: post.ambientCelsius ?? null,
    supplyVolts: post.supplyVolts ?? null,
    abortReason: post.abortReason ?? null,
    stationVerdict: post.stationVerdict ?? null,
    routedOn: post.routedOn ?? null,
    notes: post.notes ?? null,
    testPlanVersion: answer.testPlanVersion,
    limitSetVersion: answer.limitSetVersion,
    disposition: answer.disposition,
    nextStage: answer.nextStage,
    attemptsLeft: answer.attemptsLeft,
    measures: result.judgement.map(toJudgedMeasure),
    sweep: toSweep(parts),
    flagTexts: describeFlags(item.flags),
    warnings: answer.warnings,
  };
}

function toJudgedMeasure(measure: Result['judgement'][number]): JudgedMeasureDto {
  const { limit, ...rest } = measure;
  return {
    ...rest,
    limit:
      limit === null
        ? null
        : { lower: limit.lower, upper: limit.upper, rule: limit.rule, guardFactor: limit.guardFactor },
    label: describeMeasure(measure.name).label,
    sentence: describeJudgement(measure),
  };
}

function toSweep({ result, analysis, product, plan }: DetailParts): SweepDto {
  const { complianceLowVolts, complianceHighVolts, complianceTolerance } = product.spec;
  const referenceVolts = plan?.referenceVolts ?? (complianceLowVolts + complianceHighVolts) / 2;
  const { referenceAmps, limitSiemens } = result;
  const deviationPpm = (amps: number): number | null =>
    referenceAmps === null || referenceAmps === 0 ? null : (1e6 * (amps - referenceAmps)) / referenceAmps;
  return {
    referenceVolts,
    referenceAmps,
    complianceLowVolts,
    complianceHighVolts,
    complianceTolerance,
    resolutionAmps: analysis.slopeUncertainty?.resolutionAmps ?? null,
    points: analysis.points.map((point) => ({
      index: point.index,
      loadVolts: point.loadVolts,
      outputAmps: point.outputAmps,
      deviationPpm: point.overload ? null : deviationPpm(point.outputAmps),
      direction: point.direction,
      inFit: point.inFit,
      overload: point.overload,
    })),
    line: sweepLine(analysis),
    limitLine: limitLine(limitSiemens, referenceAmps, referenceVolts, [
      complianceLowVolts,
      complianceHighVolts,
    ]),
    complianceVolts: analysis.compliance.complianceVolts,
    complianceBound: analysis.compliance.bound,
    kneeFound: analysis.compliance.kneeFound,
    fit: toFit(analysis),
  };
}

function toFit({ fit, slopeUncertainty }: SweepAnalysis): SweepFitDto | null {
  if (fit === null || slopeUncertainty === null) return null;
  return {
    interceptAmps: fit.interceptAmps,
    slopeSiemens: fit.slopeSiemens,
    expandedSlopeUncertaintySiemens: slopeUncertainty.expanded,
    residualStdDevAmps: fit.residualStdDev,
    rSquared: fit.rSquared,
    degreesOfFreedom: fit.degreesOfFreedom,
  };
}

/** The steepest fall that the limit allows, drawn through the reference point. */
function limitLine(
  limitSiemens: number | null,
  referenceAmps: number | null,
  referenceVolts: number,
  ends: readonly number[],
): SweepLinePointDto[] {
  if (limitSiemens === null || referenceAmps === null || referenceAmps === 0) return [];
  return ends.map((loadVolts) => {
    const deviationPpm = (-1e6 * limitSiemens * (loadVolts - referenceVolts)) / referenceAmps;
    return { loadVolts, deviationPpm, lowPpm: deviationPpm, highPpm: deviationPpm };
  });
}
