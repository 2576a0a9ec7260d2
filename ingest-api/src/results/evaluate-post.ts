import type {
  AmmeterSpec,
  Limit,
  ResultJudgement,
  SweepAnalysis,
  SweepPoint,
} from '../analysis/analysis.types.js';
import { judgeResult } from '../analysis/judging/judge-result.js';
import { analyseSweep } from '../analysis/sweep/analyse-sweep.js';
import {
  type CatalogueLimitSet,
  type CataloguePlan,
  type CatalogueProduct,
  type CatalogueStage,
  inForceAt,
} from '../products/catalogue.js';
import type { PostedAmmeter, PostedPoint, PostedResult, RunKind } from './result.types.js';

/** Accuracy of a registered ammeter; the register wins on it. */
export interface RegisteredMeter {
  resolution: number | null;
  readingAccuracyPercent: number | null;
  rangeAccuracyPercent: number | null;
  calibrationDueOn: string | null;
}

export interface EvaluationContext {
  product: CatalogueProduct;
  stage: CatalogueStage;
  ammeter: RegisteredMeter | undefined;
  voltmeter: RegisteredMeter | undefined;
  practiceKey: boolean;
  receivedAt: number;
}

export interface Evaluation {
  runKind: RunKind;
  /** Belongs to the yields and has an attempt number. */
  counted: boolean;
  plan: CataloguePlan | null;
  limitSet: CatalogueLimitSet | null;
  analysis: SweepAnalysis;
  judgement: ResultJudgement;
  flags: string[];
}

/**
 * Instruments signal overload by a figure far beyond any range; 9.9e37 is what SCPI prescribes
 * (from memory). Such a reading is an overload, not a current.
 */
const OVERLOAD_CODE = 9e36;

/** No meter resolves less; what lies below is the dust of somebody's arithmetic, and would underflow in ours. */
const SMALLEST_READING = 1e-30;

/** A station's clock may be this far off before it is flagged. */
const TOLERATED_SKEW_MS = 30_000;

/** Computes and judges a valid post: measures, verdict and flags. Pure. */
export function evaluatePost(post: PostedResult, context: EvaluationContext): Evaluation {
  const { product, stage } = context;
  const startedAt = Date.parse(post.startedAt);
  const plan = inForceAt(stage.plans, startedAt);
  const limitSet = inForceAt(stage.limitSets, startedAt);
  const analysis = analysePost(post, context, plan);
  const judgement = judgeResult({
    analysis,
    outcome: post.outcome,
    limits: limitSet?.limits ?? null,
    product: product.spec,
  });
  const runKind = runKindOf(post, context);
  const counted =
    runKind === 'production' && judgement.verdict !== 'aborted' && judgement.verdict !== 'unjudged';
  const flags = [...analysis.flags, ...circumstances(post, context, { plan, limitSet, judgement, runKind })];
  return { runKind, counted, plan, limitSet, analysis, judgement, flags };
}

/** Also used to draw a stored post again: the same computation, nothing kept twice. */
export function analysePost(
  post: PostedResult,
  context: Pick<EvaluationContext, 'product' | 'ammeter'>,
  plan: CataloguePlan | null,
): SweepAnalysis {
  const { spec } = context.product;
  return analyseSweep({
    points: post.points.map(toSweepPoint),
    ammeter: mergeAmmeter(post.ammeter, context.ammeter),
    voltmeter: { inputOhms: post.voltmeter?.inputOhms, spansAmmeter: post.voltmeter?.spansAmmeter },
    fixtureLeakageOhms: post.fixtureLeakageOhms,
    product: spec,
    plan: {
      referenceVolts: plan?.referenceVolts ?? (spec.complianceLowVolts + spec.complianceHighVolts) / 2,
    },
  });
}

/** The limit's slope as a conductance: from the impedance limit, else from the relative slope's. */
export function limitSiemensOf(limits: readonly Limit[], referenceAmps: number | null): number | null {
  const impedance = limits.find((limit) => limit.measure === 'outputImpedance')?.lower;
  if (impedance != null && impedance > 0) return 1 / impedance;
  const slope = limits.find((limit) => limit.measure === 'relativeSlope')?.upper;
  return slope != null && referenceAmps !== null ? slope * 1e-6 * Math.abs(referenceAmps) : null;
}

function toSweepPoint(point: PostedPoint): SweepPoint {
  const loadVolts = withoutDust(point.loadVolts);
  const outputAmps = withoutDust(point.outputAmps);
  const beyond = Math.abs(outputAmps) >= OVERLOAD_CODE || Math.abs(loadVolts) >= OVERLOAD_CODE;
  return { ...point, loadVolts, outputAmps, ...(beyond ? { overload: true } : {}) };
}

const withoutDust = (reading: number): number => (Math.abs(reading) < SMALLEST_READING ? 0 : reading);

function mergeAmmeter(
  posted: PostedAmmeter | undefined,
  registered: RegisteredMeter | undefined,
): AmmeterSpec {
  return {
    rangeAmps: posted?.rangeAmps,
    resolutionAmps: posted?.resolutionAmps ?? registered?.resolution ?? undefined,
    readingAccuracyPercent: registered?.readingAccuracyPercent ?? posted?.readingAccuracyPercent,
    rangeAccuracyPercent: registered?.rangeAccuracyPercent ?? posted?.rangeAccuracyPercent,
    burdenOhms: posted?.burdenOhms,
  };
}

function runKindOf(post: PostedResult, { product, practiceKey }: EvaluationContext): RunKind {
  if (practiceKey) return 'practice';
  const claimed = post.runKind ?? 'production';
  return claimed === 'production' && product.goldenCheckHours.has(post.serialNumber) ? 'golden' : claimed;
}

/** What is odd about the post; it is stored all the same. */
function circumstances(
  post: PostedResult,
  context: EvaluationContext,
  { plan, limitSet, judgement, runKind }: Pick<Evaluation, 'plan' | 'limitSet' | 'judgement' | 'runKind'>,
): string[] {
  const { receivedAt, stage } = context;
  const highestLoad = post.points.reduce((most, point) => Math.max(most, point.loadVolts), -Infinity);
  const sentAt = post.sentAt === undefined ? null : Date.parse(post.sentAt);
  const judged =
    judgement.verdict === 'pass' || judgement.verdict === 'fail' || judgement.verdict === 'notProven';
  const oddities: [string, boolean][] = [
    ['supersededLimits', limitSet !== null && inForceAt(stage.limitSets, receivedAt) !== limitSet],
    [
      'planOutdated',
      post.testPlanVersion !== undefined && plan !== null && post.testPlanVersion !== plan.version,
    ],
    [
      'verdictMismatch',
      judged &&
        post.stationVerdict !== undefined &&
        (post.stationVerdict === 'pass') !== (judgement.verdict === 'pass'),
    ],
    ['loadAboveSupply', highestLoad > (post.supplyVolts ?? context.product.spec.supplyVolts) * 1.02],
    [
      'finishedBeforeStarted',
      post.finishedAt !== undefined && Date.parse(post.finishedAt) < Date.parse(post.startedAt),
    ],
    ['clockSkew', sentAt !== null && Math.abs(sentAt - receivedAt) > TOLERATED_SKEW_MS],
    ['goldenPostedAsProduction', runKind === 'golden' && (post.runKind ?? 'production') === 'production'],
    [
      'instrumentMismatch',
      disagrees(post.ammeter, context.ammeter) || disagrees(post.voltmeter, context.voltmeter),
    ],
  ];
  return oddities.filter(([, applies]) => applies).map(([flag]) => flag);
}

/** Post and register differ on an accuracy that both state. */
function disagrees(
  posted: Pick<PostedAmmeter, 'readingAccuracyPercent' | 'rangeAccuracyPercent'> | undefined,
  registered: RegisteredMeter | undefined,
): boolean {
  const differs = (left: number | undefined, right: number | null | undefined): boolean =>
    left !== undefined && right != null && left !== right;
  return (
    differs(posted?.readingAccuracyPercent, registered?.readingAccuracyPercent) ||
    differs(posted?.rangeAccuracyPercent, registered?.rangeAccuracyPercent)
  );
}
