import type { Verdict } from '@ampkeep/ingest-api/dist/analysis/analysis.types.js';
import { judgeResult } from '@ampkeep/ingest-api/dist/analysis/judging/judge-result.js';
import { analyseSweep } from '@ampkeep/ingest-api/dist/analysis/sweep/analyse-sweep.js';
import type { ProductFacts, StageFacts } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import type { ResultPost } from '@ampkeep/station-sim/dist/types/result-post.js';
import { limitsOf } from '../scenario/limits.js';

/** Says what the hub will say of a post, so that a history can be told before it is loaded. */
export type Judge = (post: ResultPost, product: ProductFacts, stage: StageFacts) => Verdict;

export const judgePost: Judge = (post, product, stage) => {
  const analysis = analyseSweep({
    points: post.points,
    ammeter: post.ammeter ?? {},
    voltmeter: post.voltmeter ?? {},
    product,
    plan: stage.testPlan,
  });
  return judgeResult({ analysis, outcome: post.outcome, limits: limitsOf(stage), product }).verdict;
};
