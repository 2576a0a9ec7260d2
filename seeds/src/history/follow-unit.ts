import { chooseDisposition } from '@ampkeep/ingest-api/dist/results/disposition.js';
import type { StageFacts } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import type { RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import { simulateSweep, sweepMs } from '@ampkeep/station-sim/dist/circuit/simulate-sweep.js';
import { abortReasons, lineStations } from '../scenario/line.js';
import { benchAt } from './bench-at.js';
import type { Judge } from './judge-post.js';
import type { PlannedUnit } from './plan-units.js';
import { runConditions, type SentPost } from './run-conditions.js';
import type { ShiftCalendar } from './shift-calendar.js';

/** What every unit's way through the line has in common. */
export interface LineTime {
  /** The history ends here. */
  now: Date;
  calendar: ShiftCalendar;
  judge: Judge;
}

const MINUTE_MS = 60_000;
const ABORT_SHARE = 0.006;

/** Takes a unit through its stages, testing again as the answers say, and gives its posts up to now. */
export function followUnit(planned: PlannedUnit, time: LineTime, random: RandomSource): SentPost[] {
  const sent: SentPost[] = [];
  let at = planned.startAt;
  for (const stage of planned.product.stages) {
    const passedAt = testAtStage(planned, stage, at, time, random, sent);
    if (!passedAt) break;
    at = onShift(new Date(passedAt.getTime() + random.between(90, 420) * MINUTE_MS), time, random);
  }
  return sent;
}

/** Adds the unit's posts at one stage to `sent`; gives the time it passed, null when it didn't or not yet. */
function testAtStage(
  { product, line, unit }: PlannedUnit,
  stage: StageFacts,
  arrivedAt: Date,
  time: LineTime,
  random: RandomSource,
  sent: SentPost[],
): Date | null {
  const { now, calendar, judge } = time;
  const stations = lineStations[line][stage.stage];
  let station = random.pick(stations as [string, ...string[]]);
  let startedAt = arrivedAt;
  for (let trial = 1, attempts = 0; startedAt.getTime() + sweepMs(stage) < now.getTime(); trial++) {
    const own = random.fork(`${stage.stage} ${trial}`);
    const post = simulateSweep(
      unit,
      benchAt(station, product, startedAt, now, own),
      {
        product,
        stage,
        runKind: 'production',
        ...runConditions(stage.stage, startedAt, now, calendar, own),
        ...(own.chance(ABORT_SHARE) ? { abortReason: own.pick(abortReasons) } : {}),
      },
      own,
    );
    sent.push({ station, sentAt: new Date(post.sentAt ?? startedAt), post });
    const verdict = judge(post, product, stage);
    if (verdict !== 'aborted') attempts++;
    const disposition = chooseDisposition({
      verdict,
      runKind: 'production',
      attemptsLeft: stage.maxAttempts - attempts,
      priorStagePassed: true,
      lotHeld: false,
    });
    if (disposition === 'next') return startedAt;
    if (disposition !== 'retest' && disposition !== 'retestElsewhere') return null;
    if (disposition === 'retestElsewhere') {
      station = stations.find((other) => other !== station) ?? station;
    }
    startedAt = onShift(new Date(startedAt.getTime() + own.between(3, 15) * MINUTE_MS), time, own);
  }
  return null;
}

/** A unit that comes to a station when nobody is there waits for somebody. */
function onShift(at: Date, { now, calendar }: LineTime, random: RandomSource): Date {
  let later = at.getTime();
  while (later < now.getTime() && calendar.shiftAt(new Date(later)) === 'off') {
    later += random.between(30, 150) * MINUTE_MS;
  }
  return new Date(Math.round(later));
}
