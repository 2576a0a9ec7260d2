import { setImmediate as nextTurn } from 'node:timers/promises';
import type { Clock } from '../send/clock.js';

interface Timer {
  at: number;
  resolve: () => void;
}

/** A clock without waiting: when nothing else is left to do, time jumps to the next timer. */
export function createVirtualClock(start = '2026-11-30T08:00:00Z'): Clock {
  let now = Date.parse(start);
  let pumping = false;
  const timers: Timer[] = [];

  const pump = async () => {
    pumping = true;
    while (timers.length > 0) {
      for (let turn = 0; turn < 4; turn++) await nextTurn();
      timers.sort((a, b) => a.at - b.at);
      const timer = timers.shift();
      if (!timer) break;
      now = Math.max(now, timer.at);
      timer.resolve();
    }
    pumping = false;
  };

  return {
    now: () => new Date(now),
    wait: (ms, signal) =>
      new Promise((resolve) => {
        if (signal.aborted) return resolve();
        const onAbort = () => {
          timers.splice(timers.indexOf(timer), 1);
          resolve();
        };
        const timer = {
          at: now + ms,
          resolve: () => {
            signal.removeEventListener('abort', onAbort);
            resolve();
          },
        };
        timers.push(timer);
        signal.addEventListener('abort', onAbort, { once: true });
        if (!pumping) void pump();
      }),
  };
}
