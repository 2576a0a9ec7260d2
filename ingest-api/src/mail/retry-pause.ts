const FIRST_PAUSE_MS = 15_000;
const LONGEST_PAUSE_MS = 3_600_000;
/** A pause varies by this share either way, so that mails that failed together don't come back together. */
const JITTER = 0.2;

/** After this a mail that can't be delivered is given up and shown as failed. */
export const GIVE_UP_AFTER_DAYS = 4;

/**
 * How long to wait after the n-th attempt failed: 15 s, doubled each time, at most an hour, ±20 %.
 * @param attempts - attempts made so far, at least 1
 * @param random - from 0 to 1
 */
export function pauseBeforeRetry(attempts: number, random: number): number {
  const pause = Math.min(LONGEST_PAUSE_MS, FIRST_PAUSE_MS * 2 ** (attempts - 1));
  return Math.round(pause * (1 + JITTER * (2 * random - 1)));
}

export const isGivenUp = (createdAt: number, nextTryAt: number): boolean =>
  nextTryAt - createdAt > GIVE_UP_AFTER_DAYS * 86_400_000;
