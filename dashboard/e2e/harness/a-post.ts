import { randomUUID } from 'node:crypto';

/** A sound post of a Wilson mirror, tested just now; a journey overrides what it is about. */
export function aPost(overrides: Record<string, unknown> = {}): Record<string, unknown> {
  return {
    resultId: randomUUID(),
    outcome: 'completed',
    partNumber: 'FH-R500-W',
    serialNumber: 'JOURNEY-0001',
    stage: 'board',
    startedAt: new Date().toISOString(),
    points: [
      { loadVolts: 0, outputAmps: 0.00050188 },
      { loadVolts: 2.4, outputAmps: 0.00050167 },
      { loadVolts: 4.8, outputAmps: 0.00050148 },
      { loadVolts: 8, outputAmps: 0.00050122 },
    ],
    ...overrides,
  };
}
