import { randomUUID } from 'node:crypto';
import { examplePost } from '../src/results/example-post.js';
import type { PostedPoint, PostedResult } from '../src/results/result.types.js';
import type { DescribedProduct, SiteDescription } from '../src/site-setup/site-description.js';

const longAgo = '2026-01-01T00:00:00.000Z';

/** FH-R500-W: 500 µA, Wilson mirror, promised up to 8 V; an output impedance of 5 MΩ at least. */
export function aProduct(overrides: Partial<DescribedProduct> = {}): DescribedProduct {
  const stage = (name: string): DescribedProduct['stages'][number] => ({
    stage: name,
    maxAttempts: 3,
    yieldTarget: 0.95,
    effectiveAt: longAgo,
    testPlan: { loadVolts: [0, 1.2, 2.4, 3.6, 4.8, 6, 7.2, 8], referenceVolts: 4 },
    limits: [
      { measure: 'outputImpedance', lower: 5e6, rule: 'guarded' },
      { measure: 'setpointError', lower: -1, upper: 1, rule: 'simple' },
    ],
  });
  return {
    partNumber: 'FH-R500-W',
    description: '500 µA excitation source',
    nominalAmps: 0.0005,
    supplyVolts: 9,
    complianceLowVolts: 0,
    complianceHighVolts: 8,
    complianceTolerance: 0.01,
    direction: 'source',
    circuitKind: 'wilsonMirror',
    goldenUnits: [{ serialNumber: 'GOLD-1', checkHours: 24 }],
    stages: [stage('board'), stage('final')],
    ...overrides,
  };
}

/** One product, two stations, their meters. */
export function aSite(): SiteDescription {
  return {
    products: [aProduct()],
    stations: [
      {
        station: 'north-1',
        line: 'north',
        instruments: [
          {
            kind: 'ammeter',
            serialNumber: 'AM-0031',
            readingAccuracyPercent: 0.02,
            rangeAccuracyPercent: 0.005,
            calibrationDueOn: '2027-06-30',
          },
          {
            kind: 'voltmeter',
            serialNumber: 'VM-0107',
            readingAccuracyPercent: 0.01,
            rangeAccuracyPercent: 0.002,
            calibrationDueOn: '2026-10-31',
          },
        ],
      },
      { station: 'north-2', line: 'north' },
    ],
  };
}

/** A straight sweep from 0 to 8 V of a 500 µA source with the given output impedance, read without error. */
export function sweepOf(outputImpedanceOhms: number, amps = 0.0005): PostedPoint[] {
  return [0, 1, 2, 3, 4, 5, 6, 7, 8].map((loadVolts, index) => ({
    loadVolts,
    outputAmps: amps - loadVolts / outputImpedanceOhms,
    elapsedMs: index * 500,
  }));
}

/** The docs' example at stage board, with a resultId of its own. */
export function aResult(overrides: Partial<PostedResult> = {}): PostedResult {
  return {
    ...examplePost,
    stage: 'board',
    resultId: randomUUID(),
    sentAt: '2026-11-30T11:59:59.000Z',
    ...overrides,
  };
}

/** A unit that clearly breaks the impedance limit of 5 MΩ. */
export const aFailingResult = (overrides: Partial<PostedResult> = {}): PostedResult =>
  aResult({ points: sweepOf(1e6), stationVerdict: 'fail', ...overrides });
