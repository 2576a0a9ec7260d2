import type { RandomSource } from '../circuit/random.js';
import { productByPartNumber, stageOf } from '../circuit/products.js';
import { simulateSweep, sweepMs } from '../circuit/simulate-sweep.js';
import { benchFor, stationByName } from '../circuit/stations.js';
import type { PlannedTest } from '../plan/build-plan.js';
import { benchStateOf } from '../plan/scenarios.js';
import type { ResultPost } from '../types/result-post.js';

export interface DueTest {
  test: PlannedTest;
  /** Running number of this unit's tests at this stage. */
  trial: number;
  /** Whose verdict brought the unit here. */
  routedOn: 'hub' | 'station';
}

/** A little more than the time a station takes to send after its last reading. */
const SEND_MS = 250;

/** Runs a test that ends now on one of so many stations and gives the station's post. */
export function runTest(
  { test, trial, routedOn }: DueTest,
  stationCount: number,
  now: Date,
  random: RandomSource,
): ResultPost {
  const product = productByPartNumber(test.unit.partNumber);
  const stage = stageOf(product, test.stage);
  const own = random.fork(`test ${test.runKind} ${test.number} ${test.stage} ${trial}`);
  const trouble = benchStateOf({ ...test, stationCount }, product, own.fork('trouble'));
  const bench = benchFor(stationByName(test.station), product, { fixture: test.fixture, ...trouble });
  const run = {
    product,
    stage,
    runKind: test.runKind,
    startedAt: new Date(now.getTime() - sweepMs(stage) - SEND_MS),
    operator: test.operator,
    channel: test.channel,
    programVersion: '3.4.1',
    ambientCelsius: own.normal(23, 0.5),
    routedOn,
  };
  return simulateSweep(test.unit, bench, run, own);
}
