import { useSyncExternalStore } from 'react';

const TICK_MS = 10_000;
const listeners = new Set<() => void>();
let timer: ReturnType<typeof setInterval> | undefined;
let now = Date.now();

function tick(): void {
  now = Date.now();
  listeners.forEach((listener) => listener());
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  if (!timer) {
    now = Date.now();
    timer = setInterval(tick, TICK_MS);
  }
  return () => {
    listeners.delete(listener);
    if (listeners.size > 0) return;
    clearInterval(timer);
    timer = undefined;
  };
}

function read(): number {
  // While nobody listens the time stands still but for whole ticks: two readings of one drawing must agree.
  if (!timer && Date.now() - now >= TICK_MS) now = Date.now();
  return now;
}

/** The time, in milliseconds, moved on every ten seconds by one clock for the whole page. */
export const useNow = (): number => useSyncExternalStore(subscribe, read);
