import type { LimitFacts, ProductFacts, StageFacts, StageName, TestPlanFacts } from './product-facts.js';

/* Invented products of an invented maker; figures chosen so that their circuits are plausible. */

const boardPlan = (loadVolts: readonly number[], referenceVolts: number): TestPlanFacts => ({
  version: 1,
  loadVolts,
  referenceVolts,
  dwellMs: 400,
  repeatFirst: true,
  upAndDown: false,
});

const finalPlan = (loadVolts: readonly number[], referenceVolts: number): TestPlanFacts => ({
  version: 1,
  loadVolts,
  referenceVolts,
  dwellMs: 800,
  repeatFirst: true,
  upAndDown: false,
});

/** Compliance voltage is limited by the promised range without being named. */
const limits = (impedanceOhms: number, setpointPercent: number): readonly LimitFacts[] => [
  { measure: 'outputImpedance', lower: impedanceOhms, upper: null },
  { measure: 'setpointError', lower: -setpointPercent, upper: setpointPercent },
];

export const products: readonly [ProductFacts, ...ProductFacts[]] = [
  {
    partNumber: 'FH-R500-M',
    description: '500 µA excitation module, two-transistor mirror, 9 V',
    serialPrefix: 'M',
    nominalAmps: 0.0005,
    supplyVolts: 9,
    complianceLowVolts: 0,
    complianceHighVolts: 8.4,
    complianceTolerance: 0.02,
    direction: 'source',
    circuitKind: 'twoTransistorMirror',
    hasEmitterResistors: false,
    ammeterRangeAmps: 0.001,
    circuit: {
      earlyVolts: 90,
      earlyVoltsSpread: 4.5,
      beta: 120,
      betaSpread: 9,
      mismatchSpread: 0.004,
      setResistorSpread: 0.001,
      senseVolts: 0,
    },
    stages: [
      {
        stage: 'board',
        maxAttempts: 3,
        yieldTarget: 0.96,
        testPlan: boardPlan([0, 1.4, 2.8, 4.2, 5.6, 7, 8.4], 4.2),
        limits: limits(135_000, 2.5),
      },
      {
        stage: 'final',
        maxAttempts: 2,
        yieldTarget: 0.98,
        testPlan: finalPlan([0, 0.8, 1.6, 2.4, 3.2, 4.2, 5, 5.8, 6.6, 7.5, 8.4], 4.2),
        limits: [...limits(140_000, 2), { measure: 'loadRegulation', lower: null, upper: 18 }],
      },
    ],
  },
  {
    partNumber: 'FH-R500-W',
    description: '500 µA excitation module, Wilson mirror, 9 V',
    serialPrefix: 'W',
    nominalAmps: 0.0005,
    supplyVolts: 9,
    complianceLowVolts: 0,
    complianceHighVolts: 8,
    complianceTolerance: 0.005,
    direction: 'source',
    circuitKind: 'wilsonMirror',
    hasEmitterResistors: false,
    ammeterRangeAmps: 0.001,
    circuit: {
      earlyVolts: 100,
      earlyVoltsSpread: 5,
      beta: 122,
      betaSpread: 9,
      mismatchSpread: 0.002,
      setResistorSpread: 0.001,
      senseVolts: 0,
    },
    stages: [
      {
        stage: 'board',
        maxAttempts: 3,
        yieldTarget: 0.96,
        testPlan: boardPlan([0, 1.2, 2.4, 3.6, 4.8, 6, 7.2, 8], 4.8),
        limits: limits(7_500_000, 1.2),
      },
      {
        stage: 'final',
        maxAttempts: 2,
        yieldTarget: 0.98,
        testPlan: finalPlan([0, 1.2, 2.4, 3.6, 4.8, 6, 7.2, 8], 4.8),
        limits: limits(8_000_000, 1),
      },
    ],
  },
  {
    partNumber: 'FH-T250-C',
    description: '250 µA excitation module, cascode, 15 V',
    serialPrefix: 'C',
    nominalAmps: 0.00025,
    supplyVolts: 15,
    complianceLowVolts: 0,
    complianceHighVolts: 13.5,
    complianceTolerance: 0.005,
    direction: 'source',
    circuitKind: 'cascode',
    hasEmitterResistors: false,
    ammeterRangeAmps: 0.001,
    circuit: {
      earlyVolts: 100,
      earlyVoltsSpread: 5,
      beta: 120,
      betaSpread: 9,
      mismatchSpread: 0.002,
      setResistorSpread: 0.001,
      senseVolts: 0,
    },
    stages: [
      {
        stage: 'board',
        maxAttempts: 3,
        yieldTarget: 0.96,
        testPlan: boardPlan([0, 1.5, 3, 4.5, 6, 7.5, 9, 10.5, 12, 13.5], 7.5),
        limits: limits(26_000_000, 1.8),
      },
      {
        stage: 'final',
        maxAttempts: 2,
        yieldTarget: 0.98,
        testPlan: finalPlan([0, 1, 2, 3, 4.5, 6, 7.5, 9, 10.5, 11.5, 12.5, 13.5], 7.5),
        limits: limits(28_000_000, 1.5),
      },
    ],
  },
  {
    partNumber: 'FH-B15K-A',
    description: '15 mA bridge excitation, op-amp with pass transistor, 24 V',
    serialPrefix: 'A',
    nominalAmps: 0.015,
    supplyVolts: 24,
    complianceLowVolts: 0,
    complianceHighVolts: 20,
    complianceTolerance: 0.005,
    direction: 'source',
    circuitKind: 'opAmpPassTransistor',
    hasEmitterResistors: false,
    ammeterRangeAmps: 0.1,
    circuit: {
      earlyVolts: 100,
      earlyVoltsSpread: 5,
      beta: 150,
      betaSpread: 11,
      mismatchSpread: 0.0005,
      setResistorSpread: 0.0005,
      senseVolts: 2,
    },
    stages: [
      {
        stage: 'board',
        maxAttempts: 3,
        yieldTarget: 0.96,
        testPlan: boardPlan([0, 2.5, 5, 7.5, 10, 12.5, 15, 17.5, 20], 10),
        limits: limits(550_000, 0.5),
      },
      {
        stage: 'final',
        maxAttempts: 2,
        yieldTarget: 0.98,
        testPlan: finalPlan([0, 1.5, 3, 5, 7.5, 10, 12.5, 15, 17, 18.5, 20], 10),
        limits: limits(600_000, 0.4),
      },
    ],
  },
];

/** @throws RangeError for a part number that is not made */
export function productByPartNumber(partNumber: string): ProductFacts {
  const product = products.find((candidate) => candidate.partNumber === partNumber);
  if (!product) throw new RangeError(`No product ${partNumber}`);
  return product;
}

/** @throws RangeError for a stage the product does not have */
export function stageOf(product: ProductFacts, stage: StageName): StageFacts {
  const facts = product.stages.find((candidate) => candidate.stage === stage);
  if (!facts) throw new RangeError(`${product.partNumber} has no stage ${stage}`);
  return facts;
}
