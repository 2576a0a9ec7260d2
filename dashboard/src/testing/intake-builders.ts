import type { IntakeItem, RefusedPost } from '@/types/api';

export function anAcceptedPost(overrides: Partial<IntakeItem> = {}): IntakeItem {
  return {
    intakeId: 'r1',
    kind: 'accepted',
    receivedAt: '2026-11-30T08:15:42.100Z',
    lastReceivedAt: '2026-11-30T08:15:42.100Z',
    count: 1,
    station: 'north-1',
    status: 201,
    resultId: '0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11',
    partNumber: 'FH-R500-W',
    serialNumber: 'W26480417',
    verdict: 'pass',
    errors: [],
    ...overrides,
  };
}

export function aRefusedPost(overrides: Partial<RefusedPost> = {}): RefusedPost {
  return {
    ...anAcceptedPost(),
    intakeId: 'x1',
    kind: 'refused',
    status: 422,
    verdict: null,
    serialNumber: 'W26480418',
    errors: [{ pointer: '/outcome', code: 'enum', detail: 'Must be one of: completed, aborted.' }],
    title: 'Against the contract',
    detail: '1 place needs mending.',
    body: '{\n  "serialNumber": "W26480418",\n  "outcome": "done"\n}',
    bodyBytes: 52,
    bodyTruncated: false,
    ...overrides,
  };
}
