import { createRandom, type RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import type { ResultPost } from '@ampkeep/station-sim/dist/types/result-post.js';
import { stories } from '../scenario/stories.js';
import { hoursBefore } from './bench-at.js';
import { followUnit, type SentPost } from './follow-unit.js';
import { goldenChecks } from './golden-checks.js';
import type { Judge } from './judge-post.js';
import { planUnits } from './plan-units.js';

export interface HistoryOptions {
  /** The history ends here. */
  now: Date;
  days: number;
  unitsPerDay: number;
  seed: string;
}

export interface HistoryPost {
  station: string;
  receivedAt: Date;
  post: ResultPost;
}

/** The demonstration's week. */
export const demoHistory = { days: 7, unitsPerDay: 100, seed: 'fernhollow' } as const;

const HOUR_MS = 3_600_000;

/**
 * Every post of the period, in the order in which the hub got them. Pure: same options, same posts.
 *
 * @param judge says what the hub will say, since that decides where units go
 */
export function buildHistory(options: HistoryOptions, judge: Judge): HistoryPost[] {
  const { now, days } = options;
  const random = createRandom(options.seed);
  const ofUnits = planUnits(options, random).flatMap((planned) =>
    followUnit(planned, now, judge, random.fork(`way of ${planned.unit.serialNumber}`)),
  );
  return [...ofUnits, ...goldenChecks(now, days, random)]
    .map((sent) => receive(sent, now, random))
    .sort(byArrival);
}

/** A post is received as it is sent, but for the outage: then some time after its end, in any order. */
function receive({ station, sentAt, post }: SentPost, now: Date, random: RandomSource): HistoryPost {
  const { outage } = stories;
  const hoursAgo = hoursBefore(now, sentAt);
  if (hoursAgo > outage.fromHoursAgo || hoursAgo < outage.untilHoursAgo) {
    return { station, receivedAt: sentAt, post };
  }
  const endedAt = now.getTime() - outage.untilHoursAgo * HOUR_MS;
  const delayMs = random.fork(`late ${post.resultId}`).integer(1000, 20 * 60_000);
  const receivedAt = new Date(endedAt + delayMs);
  // A station that could not send stamps the post when it goes out at last.
  return { station, receivedAt, post: { ...post, sentAt: receivedAt.toISOString() } };
}

function byArrival(left: HistoryPost, right: HistoryPost): number {
  return (
    left.receivedAt.getTime() - right.receivedAt.getTime() ||
    (left.post.resultId < right.post.resultId ? -1 : 1)
  );
}
