import { chooseDisposition } from '@ampkeep/ingest-api/dist/results/disposition.js';
import type { StageFacts } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import type { RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import { simulateSweep, sweepMs } from '@ampkeep/station-sim/dist/circuit/simulate-sweep.js';
import type { ResultPost } from '@ampkeep/station-sim/dist/types/result-post.js';
import { abortReasons, lineStations, operators } from '../scenario/line.js';
import { ambientCelsius } from './ambient.js';
import { benchAt } from './bench-at.js';
import type { Judge } from './judge-post.js';
import type { PlannedUnit } from './plan-units.js';

/** A post as it left its station. */
export interface SentPost {
  station: string;
  sentAt: Date;
  post: ResultPost;
}

const MINUTE_MS = 60_000;
const ABORT_SHARE = 0.006;

/** Takes a unit through its stages, testing again as the answers say, and gives its posts up to now. */
export function followUnit(planned: PlannedUnit, now: Date, judge: Judge, random: RandomSource): SentPost[] {
  const sent: SentPost[] = [];
  let at = planned.startAt;
  for (const stage of planned.product.stages) {
    const passedAt = testAtStage(planned, stage, at, now, judge, random, sent);
    if (!passedAt) break;
    at = new Date(passedAt.getTime() + random.between(90, 420) * MINUTE_MS);
  }
  return sent;
}

/** Adds the unit's posts at one stage to `sent`; gives the time it passed, null when it didn't or not yet. */
function testAtStage(
  { product, line, unit }: PlannedUnit,
  stage: StageFacts,
  arrivedAt: Date,
  now: Date,
  judge: Judge,
  random: RandomSource,
  sent: SentPost[],
): Date | null {
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
        startedAt,
        operator: own.pick(operators),
        programVersion: '3.4.1',
        ambientCelsius: ambientCelsius(startedAt, own),
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
    startedAt = new Date(startedAt.getTime() + Math.round(own.between(3, 15) * MINUTE_MS));
  }
  return null;
}
