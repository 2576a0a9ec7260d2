import { goldenUnitOf } from '@ampkeep/station-sim/dist/circuit/golden-units.js';
import type { StageName } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import { productByPartNumber, stageOf } from '@ampkeep/station-sim/dist/circuit/products.js';
import type { RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import { simulateSweep } from '@ampkeep/station-sim/dist/circuit/simulate-sweep.js';
import { lineStations, productMix } from '../scenario/line.js';
import { benchAt } from './bench-at.js';
import { runConditions, type SentPost } from './run-conditions.js';
import type { ShiftCalendar } from './shift-calendar.js';

/** Between two golden runs of one station. */
const RUN_MS = 4 * 60_000;

/** Every station measures the golden unit of each product it tests when a shift begins. */
export function goldenChecks(now: Date, calendar: ShiftCalendar, random: RandomSource): SentPost[] {
  const stationsToCheck = checkedStations();
  return calendar.shiftStarts.flatMap((shiftStart) =>
    stationsToCheck.flatMap(({ station, stage, partNumbers }) =>
      partNumbers.map((partNumber, index) => {
        const startedAt = new Date(shiftStart.getTime() + index * RUN_MS);
        return goldenRun(station, stage, partNumber, startedAt, now, calendar, random);
      }),
    ),
  );
}

function goldenRun(
  station: string,
  stageName: StageName,
  partNumber: string,
  startedAt: Date,
  now: Date,
  calendar: ShiftCalendar,
  random: RandomSource,
): SentPost {
  const own = random.fork(`golden ${station} ${partNumber} ${startedAt.toISOString()}`);
  const product = productByPartNumber(partNumber);
  const stage = stageOf(product, stageName);
  const post = simulateSweep(
    goldenUnitOf(partNumber),
    benchAt(station, product, startedAt, now, own),
    { product, stage, runKind: 'golden', ...runConditions(stageName, startedAt, now, calendar, own) },
    own,
  );
  return { station, sentAt: new Date(post.sentAt ?? startedAt), post };
}

function checkedStations(): { station: string; stage: StageName; partNumbers: string[] }[] {
  return Object.entries(lineStations).flatMap(([line, stages]) => {
    const partNumbers = [
      ...new Set(productMix.filter((entry) => entry.line === line).map((entry) => entry.partNumber)),
    ];
    return Object.entries(stages).flatMap(([stage, names]) =>
      names.map((station) => ({ station, stage: stage as StageName, partNumbers })),
    );
  });
}
