import { setTimeout as sleep } from 'node:timers/promises';

/** Time as the simulator sees it; tests bring their own. */
export interface Clock {
  now(): Date;
  /** Resolves after the time, or at once when the signal aborts. */
  wait(ms: number, signal: AbortSignal): Promise<void>;
}

export const systemClock: Clock = {
  now: () => new Date(),
  wait: (ms, signal) =>
    sleep(ms, undefined, { signal }).catch((error: unknown) => {
      if (!signal.aborted) throw error;
    }),
};
