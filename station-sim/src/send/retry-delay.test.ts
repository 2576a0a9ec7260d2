import { describe, expect, it } from 'vitest';
import { createRandom } from '../circuit/random.js';
import { readRetryAfterMs, retryDelayMs } from './retry-delay.js';

describe('the pause before the next try', () => {
  it('grows from half a second to half a minute and carries chance', () => {
    const random = createRandom(1);
    for (let failures = 1; failures <= 20; failures++) {
      const full = Math.min(30_000, 500 * 2 ** (failures - 1));
      const pause = retryDelayMs(failures, null, random);
      expect(pause).toBeGreaterThanOrEqual(full / 2);
      expect(pause).toBeLessThanOrEqual(full);
    }
  });

  it('is never shorter than the hub asked for', () => {
    expect(retryDelayMs(1, 7000, createRandom(1))).toBeGreaterThanOrEqual(7000);
  });
});

describe('Retry-After', () => {
  const now = new Date('2026-11-30T08:00:00Z');

  it('is read as seconds or as a date', () => {
    expect(readRetryAfterMs('3', now)).toBe(3000);
    expect(readRetryAfterMs('Mon, 30 Nov 2026 08:00:10 GMT', now)).toBe(10_000);
    expect(readRetryAfterMs('Mon, 30 Nov 2026 07:00:00 GMT', now)).toBe(0);
  });

  it('is nothing when absent or unreadable', () => {
    expect(readRetryAfterMs(null, now)).toBeNull();
    expect(readRetryAfterMs('soon', now)).toBeNull();
  });
});
