import fc from 'fast-check';
import { absurdPosts } from '../../test/absurd-posts.builder.js';
import type { Limit } from '../analysis/analysis.types.js';
import { describeJudgement } from '../analysis/judging/describe-judgement.js';
import type { CatalogueProduct, CatalogueStage } from '../products/catalogue.js';
import { type EvaluationContext, evaluatePost } from './evaluate-post.js';
import { findFaults } from './validate-post.js';

const limits: Limit[] = [
  { measure: 'outputImpedance', lower: 5e6, upper: null, rule: 'guarded', guardFactor: 1 },
  { measure: 'setpointError', lower: -1, upper: 1, rule: 'simple', guardFactor: 1 },
  { measure: 'linearityError', lower: null, upper: 50, rule: 'guarded', guardFactor: 1 },
];
const released = { version: 1, releasedAt: 0, effectiveAt: -1e15 };
const stage: CatalogueStage = {
  stageId: 1,
  name: 'board',
  position: 1,
  maxAttempts: 3,
  yieldTarget: null,
  plans: [
    {
      ...released,
      loadVolts: [0, 4, 8],
      referenceVolts: 4,
      dwellMs: 0,
      repeatFirst: false,
      upAndDown: false,
    },
  ],
  limitSets: [{ ...released, limits, releasedBy: 'test' }],
};
const product: CatalogueProduct = {
  productId: 1,
  partNumber: 'FH-R500-W',
  description: '500 µA source',
  direction: 'source',
  spec: {
    nominalAmps: 0.0005,
    supplyVolts: 9,
    complianceLowVolts: 0,
    complianceHighVolts: 8,
    complianceTolerance: 0.01,
    circuitKind: 'twoTransistorMirror',
    hasEmitterResistors: false,
  },
  stages: [stage],
  goldenCheckHours: new Map(),
};
const context: EvaluationContext = {
  product,
  stage,
  ammeter: undefined,
  voltmeter: undefined,
  practiceKey: false,
  receivedAt: Date.parse('2026-11-30T12:00:00Z'),
};

/** Places of figures that are none. */
function nonFigures(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} = ${value}`];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => nonFigures(inner, `${path}/${key}`));
}

describe('evaluating a post that the schema allows, however absurd', () => {
  it('never gives infinity or NaN, and has words for each judgement', () => {
    fc.assert(
      fc.property(absurdPosts, (post) => {
        expect(findFaults(post)).toEqual([]);
        const { analysis, judgement } = evaluatePost(post, context);
        expect(nonFigures({ analysis, judgement })).toEqual([]);
        for (const measure of judgement.measures) expect(describeJudgement(measure)).toMatch(/\S/);
      }),
      { numRuns: 500 },
    );
  });
});
