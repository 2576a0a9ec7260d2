import fc from 'fast-check';
import { TooManyRequestsError } from '../common/errors.js';
import { SignInThrottle } from './sign-in-throttle.js';

const start = Date.parse('2026-11-30T08:00:00Z');

function aThrottle() {
  const time = { now: start };
  const throttle = new SignInThrottle(() => time.now);
  /** Seconds to wait, 0 when the attempt was let through (and counted as failed). */
  const fail = (account: string, address = '192.0.2.7'): number => {
    try {
      throttle.begin(account, address);
      return 0;
    } catch (error) {
      return (error as TooManyRequestsError).retryAfterSeconds ?? NaN;
    }
  };
  return { time, throttle, fail };
}

const failTimes = (count: number, fail: () => number): void => {
  for (let i = 0; i < count; i += 1) fail();
};

describe('throttling of sign-ins', () => {
  it('pauses an account after five failures, even when they are sent side by side', () => {
    const { fail } = aThrottle();
    failTimes(5, () => fail('rosalind@example.org'));
    expect(fail('rosalind@example.org')).toBe(15);
    expect(fail('tomasz@example.org')).toBe(0);
  });

  it('doubles the pause with each further failure, up to a quarter of an hour', () => {
    const { fail, time } = aThrottle();
    failTimes(4, () => fail('rosalind@example.org'));
    const pauses: number[] = [];
    for (let i = 0; i < 8; i += 1) {
      fail('rosalind@example.org', `192.0.2.${i}`);
      const seconds = fail('rosalind@example.org', `192.0.2.${i}`);
      pauses.push(seconds);
      time.now += seconds * 1000;
    }
    expect(pauses).toEqual([15, 30, 60, 120, 240, 480, 900, 900]);
  });

  it('pauses a network address that tries account after account', () => {
    const { fail } = aThrottle();
    for (let i = 0; i < 20; i += 1) expect(fail(`person${i}@example.org`)).toBe(0);
    expect(fail('another@example.org')).toBe(15);
    expect(fail('another@example.org', '192.0.2.8')).toBe(0);
  });

  it('forgives an account that signs in, and what an hour ago was', () => {
    const { fail, throttle, time } = aThrottle();
    failTimes(4, () => fail('rosalind@example.org'));
    throttle.begin('rosalind@example.org', '192.0.2.7').succeeded();
    failTimes(5, () => fail('rosalind@example.org'));
    expect(fail('rosalind@example.org')).toBe(15);
    time.now += 60 * 60_000;
    failTimes(5, () => fail('rosalind@example.org'));
    expect(fail('rosalind@example.org')).toBe(15);
  });

  it('lets a guesser with an account of the own try no more of the others than without', () => {
    const { throttle, fail } = aThrottle();
    let guesses = 0;
    for (let i = 0; i < 100; i += 1) {
      if (fail(`person${i}@example.org`) === 0) guesses += 1;
      try {
        throttle.begin('own@example.org', '192.0.2.7').succeeded();
      } catch {
        // Paused: the own account can't sign in either.
      }
    }
    expect(guesses).toBe(20);
  });

  it('never pauses an account that mixes up to four failures with successes, in any order', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 4 }), { maxLength: 4 }), (failuresBetween) => {
        const { throttle, fail } = aThrottle();
        for (const count of failuresBetween) {
          for (let i = 0; i < count; i += 1) expect(fail('rosalind@example.org')).toBe(0);
          throttle.begin('rosalind@example.org', '192.0.2.7').succeeded();
        }
      }),
    );
  });
});
