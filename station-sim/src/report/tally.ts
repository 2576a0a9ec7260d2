import type { Delivery } from '../send/station-lane.js';
import type { ResultAnswer } from '../types/result-answer.js';

/** Running counts of a simulation. */
export interface Tally {
  /** Tests run in this simulation. */
  tested: number;
  /** Posts that an earlier run had left in the spool. */
  replayed: number;
  accepted: number;
  verdicts: Record<ResultAnswer['verdict'], number>;
  refused: number;
  /** Posts without an answer yet. */
  waiting: number;
  /** Tries that failed and were repeated. */
  retries: number;
  lastTrouble: string | null;
  /** Why the run can't go on; null while it can. */
  blocked: string | null;
}

export function emptyTally(): Tally {
  return {
    tested: 0,
    replayed: 0,
    accepted: 0,
    verdicts: { pass: 0, fail: 0, notProven: 0, unjudged: 0, aborted: 0 },
    refused: 0,
    waiting: 0,
    retries: 0,
    lastTrouble: null,
    blocked: null,
  };
}

/** Counts how a post ended; what stays in the spool goes on waiting. */
export function countDelivery(tally: Tally, delivery: Delivery): void {
  switch (delivery.kind) {
    case 'accepted':
      tally.waiting--;
      tally.accepted++;
      tally.verdicts[delivery.answer.verdict]++;
      break;
    case 'refused':
      tally.waiting--;
      tally.refused++;
      tally.lastTrouble = delivery.reason;
      break;
    case 'blocked':
      tally.blocked = delivery.reason;
      break;
    case 'kept':
      tally.lastTrouble ??= delivery.reason;
      break;
  }
}
