import { productByPartNumber, stageOf } from '../circuit/products.js';
import { sweepMs } from '../circuit/simulate-sweep.js';
import { nextTest } from '../plan/next-test.js';
import type { Clock } from '../send/clock.js';
import type { ResultAnswer } from '../types/result-answer.js';
import type { ResultPost } from '../types/result-post.js';
import type { DueTest } from './run-test.js';

/** Units on their way to another test. */
export interface WaitingRoom {
  /** The unit that has been due longest, taken out; null when none is due. */
  takeDue(now: Date): DueTest | null;
  isEmpty(): boolean;
  /** Moves a tested unit on, once: by the first of the answer or the news that none came (null). */
  moverOf(
    tested: DueTest,
    post: ResultPost,
    stationCount: number,
    clock: Clock,
  ): (answer: ResultAnswer | null) => void;
}

/** Time to take a unit out, carry it and put it in again. */
const HANDLING_MS = 1500;

export function createWaitingRoom(): WaitingRoom {
  const waiting: { dueAt: number; due: DueTest }[] = [];
  return {
    takeDue(now) {
      const index = waiting.findIndex((entry) => entry.dueAt <= now.getTime());
      return index < 0 ? null : (waiting.splice(index, 1)[0]?.due ?? null);
    },
    isEmpty: () => waiting.length === 0,
    moverOf(tested, post, stationCount, clock) {
      let moved = false;
      return (answer) => {
        if (moved) return;
        moved = true;
        const test = nextTest(tested.test, post, answer, stationCount);
        if (!test) return;
        const stage = stageOf(productByPartNumber(test.unit.partNumber), test.stage);
        waiting.push({
          dueAt: clock.now().getTime() + HANDLING_MS + sweepMs(stage),
          due: {
            test,
            trial: test.stage === tested.test.stage ? tested.trial + 1 : 1,
            routedOn: answer ? 'hub' : 'station',
          },
        });
      };
    },
  };
}
