import type { RandomSource } from '../circuit/random.js';

const FIRST_MS = 500;
const LONGEST_MS = 30_000;

/**
 * How long to wait before the next try: half to all of a pause that doubles from 0.5 s to 30 s, never less
 * than the hub asked for. The chance part keeps stations from coming back all at once.
 *
 * @param failures how often it has failed so far, from 1
 * @param retryAfterMs what the hub asked for, null if it asked for nothing
 */
export function retryDelayMs(failures: number, retryAfterMs: number | null, random: RandomSource): number {
  const pause = Math.min(LONGEST_MS, FIRST_MS * 2 ** (failures - 1));
  return (retryAfterMs ?? 0) + pause * random.between(0.5, 1);
}

/** Reads `Retry-After`: seconds or an HTTP date (RFC 9110, section 10.2.3). Null when absent or unreadable. */
export function readRetryAfterMs(header: string | null, now: Date): number | null {
  if (header === null) return null;
  if (/^\d+$/.test(header.trim())) return Number(header) * 1000;
  const at = Date.parse(header);
  return Number.isNaN(at) ? null : Math.max(0, at - now.getTime());
}
