import type { LimitSet, Product, TestPlan } from '@/types/api';

export function aProduct(overrides: Partial<Product> = {}): Product {
  return {
    partNumber: 'FH-R500-W',
    description: 'Excitation module 500 µA, Wilson mirror, 9 V',
    nominalAmps: 0.0005,
    supplyVolts: 9,
    complianceLowVolts: 0,
    complianceHighVolts: 8,
    complianceTolerance: 0.01,
    direction: 'source',
    circuitKind: 'wilsonMirror',
    caution: null,
    stages: ['board', 'final'].map((stage, place) => ({
      stage,
      position: place + 1,
      maxAttempts: 3,
      yieldTarget: 0.95,
      testPlan: null,
      limitSet: null,
    })),
    ...overrides,
  };
}

export function aTestPlan(overrides: Partial<TestPlan> = {}): TestPlan {
  return {
    version: 3,
    loadVolts: [0, 4, 8],
    referenceVolts: 4,
    dwellMs: 200,
    repeatFirst: true,
    upAndDown: false,
    ...overrides,
  };
}

export function aLimitSet(overrides: Partial<LimitSet> = {}): LimitSet {
  return {
    version: 2,
    releasedAt: '2026-10-30T12:00:00.000Z',
    effectiveAt: '2026-11-01T00:00:00.000Z',
    releasedBy: 'Ines Calder',
    limits: [
      {
        measure: 'outputImpedance',
        lower: 1e7,
        upper: null,
        rule: 'guarded',
        guardFactor: 1,
        guardedRisk: 0.02275,
      },
    ],
    ...overrides,
  };
}
