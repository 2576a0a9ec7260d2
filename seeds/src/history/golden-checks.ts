import { goldenUnitOf } from '@ampkeep/station-sim/dist/circuit/golden-units.js';
import type { StageName } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import { productByPartNumber, stageOf } from '@ampkeep/station-sim/dist/circuit/products.js';
import type { RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import { simulateSweep } from '@ampkeep/station-sim/dist/circuit/simulate-sweep.js';
import { GOLDEN_CHECK_HOURS, lineStations, operators, productMix } from '../scenario/line.js';
import { ambientCelsius } from './ambient.js';
import { benchAt } from './bench-at.js';
import type { SentPost } from './follow-unit.js';

const HOUR_MS = 3_600_000;

/** Between two golden runs of one station. */
const RUN_MS = 4 * 60_000;

/** Every station measures the golden unit of each product it tests, once a check period. */
export function goldenChecks(now: Date, days: number, random: RandomSource): SentPost[] {
  const sent: SentPost[] = [];
  const checks = Math.floor((days * 24) / GOLDEN_CHECK_HOURS);
  for (let check = checks; check >= 1; check--) {
    // The last round lies some hours back, so that none is owed the moment the history ends.
    const roundAt = now.getTime() - (check * GOLDEN_CHECK_HOURS - 18) * HOUR_MS;
    for (const { station, stage, partNumbers } of checkedStations()) {
      for (const [index, partNumber] of partNumbers.entries()) {
        const startedAt = new Date(roundAt + index * RUN_MS);
        sent.push(goldenRun(station, stage, partNumber, startedAt, now, random));
      }
    }
  }
  return sent;
}

function goldenRun(
  station: string,
  stage: StageName,
  partNumber: string,
  startedAt: Date,
  now: Date,
  random: RandomSource,
): SentPost {
  const own = random.fork(`golden ${station} ${partNumber} ${now.getTime() - startedAt.getTime()}`);
  const product = productByPartNumber(partNumber);
  const run = {
    product,
    stage: stageOf(product, stage),
    runKind: 'golden',
    startedAt,
    operator: own.pick(operators),
    programVersion: '3.4.1',
    ambientCelsius: ambientCelsius(startedAt, own),
  } as const;
  const post = simulateSweep(
    goldenUnitOf(partNumber),
    benchAt(station, product, startedAt, now, own),
    run,
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
