import { describe, expect, it } from 'vitest';
import { createRandom } from '../circuit/random.js';
import { productByPartNumber, stageOf } from '../circuit/products.js';
import { fitLine } from '../circuit/station-verdict.js';
import { buildPlan, type PlannedTest } from '../plan/build-plan.js';
import { scenarios, troubledStation, type Scenario } from '../plan/scenarios.js';
import type { ResultPost } from '../types/result-post.js';
import { runTest } from './run-test.js';

const STATIONS = 3;
const now = new Date('2026-11-30T08:00:00Z');

interface Tested {
  test: PlannedTest;
  post: ResultPost;
}

/** First tests of the first units of a scenario. */
function runFirstTests(scenario: Scenario, count = 300): Tested[] {
  const random = createRandom('scenarios');
  const tested: Tested[] = [];
  for (const test of buildPlan({ scenario, stations: STATIONS, madeAt: now }, random)) {
    tested.push({ test, post: runTest({ test, trial: 1, routedOn: 'hub' }, STATIONS, now, random) });
    if (tested.length === count) break;
  }
  return tested;
}

const troubled = troubledStation(STATIONS);
const production = (tested: readonly Tested[]) => tested.filter(({ test }) => test.runKind === 'production');
const isThere = ({ test }: Tested) => test.station === troubled;

const failShare = (tested: readonly Tested[]) =>
  tested.filter(({ post }) => post.stationVerdict === 'fail').length / tested.length;

/** Relative difference between the current at the reference voltage and the nominal one. */
const setpointError = ({ post }: Tested) => {
  const product = productByPartNumber(post.partNumber);
  const { referenceVolts } = stageOf(product, 'board').testPlan;
  const { interceptAmps, slopeSiemens } = fitLine(post.points);
  return (interceptAmps + slopeSiemens * referenceVolts) / product.nominalAmps - 1;
};

const median = (values: readonly number[]) => [...values].sort((a, b) => a - b)[values.length >> 1] ?? NaN;

describe('a scenario', () => {
  it.each(scenarios)('%s makes the same sweeps from the same seed', (scenario) => {
    expect(runFirstTests(scenario, 40)).toEqual(runFirstTests(scenario, 40));
  });

  it.each(['drift', 'coarse-meter', 'poor-contact'] as const)(
    '%s leaves the other stations alone',
    (scenario) => {
      const posts = (of: Scenario) =>
        runFirstTests(of)
          .filter((entry) => !isThere(entry))
          .map(({ post }) => post);
      expect(posts(scenario)).toEqual(posts('steady'));
    },
  );
});

describe('what a scenario promises', () => {
  it('drift: the last station reads more and more, until units fail there', () => {
    const there = production(runFirstTests('drift')).filter(isThere);
    const sound = there.filter(({ test }) => test.unit.defect === null);
    const early = sound.filter(({ test }) => test.number < 30);
    const late = sound.filter(({ test }) => test.number > 150);
    expect(Math.abs(median(early.map(setpointError)))).toBeLessThan(0.006);
    expect(median(late.map(setpointError))).toBeGreaterThan(0.015);
    expect(failShare(early)).toBeLessThan(0.1);
    expect(failShare(late)).toBeGreaterThan(0.5);
  });

  it('bad-lot: most units of one product and lot have too low an output impedance, the others don’t', () => {
    const tested = production(runFirstTests('bad-lot'));
    const isBad = ({ test }: Tested) => test.unit.partNumber === 'FH-R500-M';
    const bad = tested.filter(isBad);
    expect(new Set(bad.map(({ post }) => post.lot)).size).toBe(1);
    expect(failShare(bad)).toBeGreaterThan(0.7);
    expect(failShare(tested.filter((entry) => !isBad(entry)))).toBeLessThan(0.06);
    // −1/slope of a sound unit is about 180 kΩ; 135 kΩ is the limit.
    const ohms = bad
      .filter(({ test }) => test.unit.defect === null)
      .map(({ post }) => -1 / fitLine(post.points).slopeSiemens);
    expect(median(ohms)).toBeLessThan(135_000);
    expect(median(ohms)).toBeGreaterThan(110_000);
  });

  it('coarse-meter: the last station resolves 1 µA, too little to tell an impedance', () => {
    const there = runFirstTests('coarse-meter').filter(isThere);
    for (const { post } of there) {
      expect(post.ammeter).toMatchObject({ rangeAmps: 0.1, resolutionAmps: 1e-6 });
    }
    const wilson = there.filter(
      ({ test }) => test.unit.partNumber === 'FH-R500-W' && test.unit.defect === null,
    );
    expect(wilson.length).toBeGreaterThan(10);
    for (const { post } of wilson) {
      expect(new Set(post.points.map(({ outputAmps }) => outputAmps)).size).toBeLessThanOrEqual(3);
    }
  });

  it('poor-contact: units on fixture 2 of the last station lose current at high load voltage', () => {
    const there = production(runFirstTests('poor-contact', 600)).filter(isThere);
    const onFixture = (fixture: string) => there.filter(({ post }) => post.fixture === fixture);
    expect(failShare(onFixture('2'))).toBeGreaterThan(0.3);
    expect(failShare(onFixture('1'))).toBeLessThan(0.1);
  });

  it('outage: the readings are those of a steady line', () => {
    expect(runFirstTests('outage').map(({ post }) => post)).toEqual(
      runFirstTests('steady').map(({ post }) => post),
    );
  });
});
