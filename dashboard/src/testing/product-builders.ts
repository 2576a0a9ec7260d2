import type { Product } from '@/types/api';

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
