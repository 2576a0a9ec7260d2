import { exactInterval } from '../analysis/yield/exact-interval.js';
import type { StationActivity } from '../stations/station-activity.service.js';
import type { TodayChangeDto, TodayProductDto, TodayStageDto } from './dto/today.dto.js';

/** A station that worked today and then said nothing for this long fell silent. */
const SILENCE_MS = 30 * 60_000;
/** Fewer units than this ring no bell, however bad they are. */
const FEWEST_UNITS = 5;
const percent = (share: number): string => `${(100 * share).toFixed(1)} %`;

/**
 * What is getting worse, in words. A yield counts as worse only when its interval proves it: the whole exact
 * interval of today lies below last week's share. (Wilson's, which is shown, would claim too much of a few units.)
 */
export function findWorse(
  products: readonly TodayProductDto[],
  stations: readonly StationActivity[],
  dayStart: number,
  now: number,
): TodayChangeDto[] {
  const changes: TodayChangeDto[] = [];
  for (const { partNumber, stages } of products) {
    for (const stage of stages) {
      const place = { partNumber, stage: stage.stage, station: null };
      const dropped = firstPassText(stage);
      if (dropped !== null) changes.push({ kind: 'firstPass', text: dropped, ...place });
      const unproven = notProvenText(stage);
      if (unproven !== null) changes.push({ kind: 'notProven', text: unproven, ...place });
    }
  }
  for (const { station, lastPostAt } of stations) {
    if (lastPostAt === null || lastPostAt < dayStart || now - lastPostAt < SILENCE_MS) continue;
    const minutes = Math.round((now - lastPostAt) / 60_000);
    changes.push({
      kind: 'silent',
      text: `${station} posted nothing for ${minutes} minutes`,
      partNumber: null,
      stage: null,
      station,
    });
  }
  return changes;
}

function firstPassText({ firstPass, previous }: TodayStageDto): string | null {
  const interval = provenInterval(firstPass.passed, firstPass.total);
  if (interval === null || firstPass.share === null || previous.share === null) return null;
  if (interval.high >= previous.share) return null;
  return `First-pass yield ${percent(firstPass.share)}, was ${percent(previous.share)} over the seven days before`;
}

const provenInterval = (count: number, total: number) =>
  total < FEWEST_UNITS ? null : exactInterval(count, total);

/** One in twenty is what an adequate meter should never reach. */
const TOLERABLE_NOT_PROVEN = 0.05;

function notProvenText({ notProven, firstPass: { total } }: TodayStageDto): string | null {
  const interval = provenInterval(notProven, total);
  if (interval === null || interval.low <= TOLERABLE_NOT_PROVEN) return null;
  return `${notProven} of ${total} first attempts could not be proven: check ranges and meters`;
}
