import type { YieldBucket, YieldGroup, YieldReport } from '@/types/api';
import { aYield } from './builders';

export function aYieldBucket(overrides: Partial<YieldBucket> = {}): YieldBucket {
  return {
    startAt: '2026-11-29T00:00:00.000Z',
    endAt: '2026-11-30T00:00:00.000Z',
    firstPass: aYield(),
    final: aYield({ passed: 98, share: 0.98 }),
    failed: 3,
    notProven: 1,
    openUnits: 1,
    rolledThroughput: null,
    ...overrides,
  };
}

export function aYieldGroup(overrides: Partial<YieldGroup> = {}): YieldGroup {
  return {
    name: 'north-1',
    firstPass: aYield(),
    final: aYield({ passed: 98, share: 0.98 }),
    failed: 3,
    notProven: 1,
    openUnits: 1,
    buckets: [aYield(), aYield()],
    ...overrides,
  };
}

/** Two days with units. */
export function aYieldReport(overrides: Partial<YieldReport> = {}): YieldReport {
  return {
    from: '2026-11-29',
    to: '2026-11-30',
    by: 'day',
    timeZone: 'UTC',
    whole: {
      firstPass: aYield({ passed: 192, total: 200 }),
      final: aYield({ passed: 196, total: 200, share: 0.98 }),
      failed: 6,
      notProven: 2,
      openUnits: 2,
    },
    rolledThroughput: null,
    buckets: [
      aYieldBucket(),
      aYieldBucket({ startAt: '2026-11-30T00:00:00.000Z', endAt: '2026-12-01T00:00:00.000Z' }),
    ],
    groups: [],
    failingMeasures: [
      { measure: 'outputImpedance', label: 'Output impedance', units: 4, cumulativeShare: 0.8 },
      { measure: 'setpointError', label: 'Setpoint error', units: 1, cumulativeShare: 1 },
    ],
    retests: { retested: 7, total: 200, passedOnSecond: 4 },
    aborts: { aborted: 3, total: 210 },
    markers: [],
    ...overrides,
  };
}
