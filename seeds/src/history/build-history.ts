import { createRandom, type RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import type { ResultPost } from '@ampkeep/station-sim/dist/types/result-post.js';
import { type Outage, outageBefore } from '../scenario/stories.js';
import { followUnit } from './follow-unit.js';
import { goldenChecks } from './golden-checks.js';
import type { Judge } from './judge-post.js';
import { planUnits } from './plan-units.js';
import type { SentPost } from './run-conditions.js';
import { createShiftCalendar } from './shift-calendar.js';

export interface HistoryOptions {
  /** The history ends here. */
  now: Date;
  days: number;
  /** How many units come to the line in an hour at full speed. */
  unitsPerHour: number;
  seed: string;
}

export interface HistoryPost {
  station: string;
  receivedAt: Date;
  post: ResultPost;
}

/** The demonstration's two months: about 20,000 results. */
export const demoHistory = { days: 60, unitsPerHour: 12, seed: 'fernhollow' } as const;

const DAY_MS = 86_400_000;

/**
 * Every post of the period, in the order in which the hub got them. Pure: same options, same posts. Posts are made
 * as they are asked for, a day at a time, so that two months of them never stand in memory together.
 *
 * @param judge says what the hub will say, since that decides where units go
 */
export function* buildHistory(options: HistoryOptions, judge: Judge): Generator<HistoryPost, void> {
  const { now, days } = options;
  const random = createRandom(options.seed);
  const startAt = new Date(now.getTime() - days * DAY_MS);
  const calendar = createShiftCalendar(startAt, now);
  const outage = outageBefore(now);
  const arrive = (sent: SentPost) => receive(sent, outage, random);

  let waiting = goldenChecks(now, calendar, random).map(arrive);
  let dayEndsAt = new Date(startAt.getTime() + DAY_MS);
  for (const planned of planUnits(options, calendar, random)) {
    if (planned.startAt >= dayEndsAt) {
      // Whatever is still to come arrives after this unit's start.
      const due = ({ receivedAt }: HistoryPost) => receivedAt < planned.startAt;
      yield* waiting.filter(due).sort(byArrival);
      waiting = waiting.filter((entry) => !due(entry));
      dayEndsAt = new Date(planned.startAt.getTime() + DAY_MS);
    }
    const ofUnit = followUnit(planned, { now, calendar, judge }, random.fork(planned.unit.serialNumber));
    waiting.push(...ofUnit.map(arrive));
  }
  yield* waiting.filter(({ receivedAt }) => receivedAt <= now).sort(byArrival);
}

/** A post is received as it is sent, but for the outage: then some time after its end, in any order. */
function receive({ station, sentAt, post }: SentPost, outage: Outage, random: RandomSource): HistoryPost {
  if (sentAt < outage.from || sentAt >= outage.until) return { station, receivedAt: sentAt, post };
  const delayMs = random.fork(`late ${post.resultId}`).integer(1000, 20 * 60_000);
  const receivedAt = new Date(outage.until.getTime() + delayMs);
  // A station that could not send went by its own verdict, and stamps the post when it goes out at last.
  return {
    station,
    receivedAt,
    post: { ...post, sentAt: receivedAt.toISOString(), routedOn: 'station' },
  };
}

function byArrival(left: HistoryPost, right: HistoryPost): number {
  return (
    left.receivedAt.getTime() - right.receivedAt.getTime() ||
    (left.post.resultId < right.post.resultId ? -1 : 1)
  );
}
