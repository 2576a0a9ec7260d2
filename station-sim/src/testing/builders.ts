import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { ResultAnswer } from '../types/result-answer.js';
import type { ResultPost } from '../types/result-post.js';

export const aPost = (overrides: Partial<ResultPost> = {}): ResultPost => ({
  resultId: '0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11',
  runKind: 'production',
  outcome: 'completed',
  partNumber: 'FH-R500-W',
  serialNumber: 'W26480417',
  stage: 'final',
  startedAt: '2026-11-30T08:15:30.120Z',
  points: [
    { loadVolts: 0, outputAmps: 0.00050188 },
    { loadVolts: 4, outputAmps: 0.00050154 },
    { loadVolts: 8, outputAmps: 0.00050122 },
  ],
  ...overrides,
});

export const anAnswer = (overrides: Partial<ResultAnswer> = {}): ResultAnswer => ({
  resultId: '0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11',
  verdict: 'pass',
  disposition: 'next',
  ...overrides,
});

/** Gives the test a file path in a directory of its own that is removed afterwards. */
export async function withTemporaryFile(name: string, test: (file: string) => Promise<void>): Promise<void> {
  const directory = await mkdtemp(join(tmpdir(), 'station-sim-'));
  try {
    await test(join(directory, name));
  } finally {
    await rm(directory, { recursive: true });
  }
}
