import fc from 'fast-check';
import { isGivenUp, pauseBeforeRetry } from './retry-pause.js';

describe('pauseBeforeRetry', () => {
  it('begins with 15 s and doubles', () => {
    expect([1, 2, 3, 4].map((attempts) => pauseBeforeRetry(attempts, 0.5))).toEqual([
      15_000, 30_000, 60_000, 120_000,
    ]);
  });

  it('stays within an hour and a fifth, however often it failed', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 5000 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (attempts, random) => {
          const pause = pauseBeforeRetry(attempts, random);
          expect(pause).toBeGreaterThanOrEqual(12_000);
          expect(pause).toBeLessThanOrEqual(4_320_000);
        },
      ),
    );
  });

  it('spreads mails that failed together', () => {
    expect(pauseBeforeRetry(1, 0)).toBe(12_000);
    expect(pauseBeforeRetry(1, 1)).toBe(18_000);
  });
});

describe('isGivenUp', () => {
  it('lets a mail wait four days', () => {
    const fourDays = 4 * 86_400_000;
    expect(isGivenUp(1000, 1000 + fourDays)).toBe(false);
    expect(isGivenUp(1000, 1001 + fourDays)).toBe(true);
  });
});
