import type { YieldResult } from './yield.types.js';

export interface LineResult extends YieldResult {
  station: string;
}

/** A counted production result that passed; fixed values for specs. */
export function aYieldResult(overrides: Partial<LineResult> = {}): LineResult {
  return {
    resultId: 'r-1',
    partNumber: 'FH-R500-W',
    serialNumber: 'W1',
    stage: 'final',
    startedAt: '2026-11-30T08:00:00.000Z',
    finishedAt: '2026-11-30T08:00:10.000Z',
    runKind: 'production',
    outcome: 'completed',
    verdict: 'pass',
    voided: false,
    station: 'north-1',
    ...overrides,
  };
}
