import type { RandomSource } from '../circuit/random.js';
import type { ResultPost } from '../types/result-post.js';
import type { Clock } from './clock.js';
import type { Attempt, PostResult } from './post-result.js';
import { retryDelayMs } from './retry-delay.js';
import type { Spool } from './spool.js';

/** How a post ended: taken, refused for good, or kept in the spool for another run. */
export type Delivery =
  Extract<Attempt, { kind: 'accepted' | 'refused' | 'blocked' }> | { kind: 'kept'; reason: string };

/** The way of one station's posts to the hub: one after the other, each until it is settled. */
export interface StationLane {
  /** @param onTrouble called for every try that failed and will be repeated */
  deliver(post: ResultPost, onTrouble: (reason: string) => void): Promise<Delivery>;
}

export interface LaneParts {
  apiKey: string;
  send: PostResult;
  spool: Spool;
  clock: Clock;
  random: RandomSource;
  /** Aborted: no more tries, what is unsettled stays in the spool. */
  giveUp: AbortSignal;
}

export function createStationLane(parts: LaneParts): StationLane {
  let last: Promise<unknown> = Promise.resolve();
  return {
    deliver(post, onTrouble) {
      const delivery = last.then(() => deliverOne(parts, post, onTrouble));
      last = delivery.catch(() => undefined);
      return delivery;
    },
  };
}

async function deliverOne(
  { apiKey, send, spool, clock, random, giveUp }: LaneParts,
  post: ResultPost,
  onTrouble: (reason: string) => void,
): Promise<Delivery> {
  let reason = 'the run ended before it was sent';
  for (let failures = 1; !giveUp.aborted; failures++) {
    const attempt = await send(apiKey, post, giveUp);
    if (attempt.kind === 'blocked') return attempt;
    if (attempt.kind !== 'tryAgain') {
      await spool.remove(post.resultId);
      return attempt;
    }
    reason = attempt.reason;
    onTrouble(reason);
    await clock.wait(retryDelayMs(failures, attempt.retryAfterMs, random), giveUp);
  }
  return { kind: 'kept', reason };
}
