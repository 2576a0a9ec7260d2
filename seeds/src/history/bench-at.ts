import type { ProductFacts } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import type { RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import { benchFor, stationByName, type Bench } from '@ampkeep/station-sim/dist/circuit/stations.js';
import { stories } from '../scenario/stories.js';

const HOUR_MS = 3_600_000;

export const hoursBefore = (now: Date, at: Date): number => (now.getTime() - at.getTime()) / HOUR_MS;

/** The state a station is in at a time, with what the stories do to it. */
export function benchAt(
  station: string,
  product: ProductFacts,
  at: Date,
  now: Date,
  random: RandomSource,
): Bench {
  const facts = stationByName(station);
  const fixture = random.pick(facts.fixtures);
  const hoursAgo = hoursBefore(now, at);
  const contactOhms = worn(station, fixture, hoursAgo, random) / product.nominalAmps;
  return benchFor(facts, product, {
    fixture,
    gainDrift: gainDriftOf(station, hoursAgo),
    ...(isCoarse(station, hoursAgo) ? { rangeAmps: stories.coarseRange.rangeAmps } : {}),
    ...(contactOhms > 0 ? { contactOhms } : {}),
  });
}

function gainDriftOf(station: string, hoursAgo: number): number {
  const { gainDrift } = stories;
  if (station !== gainDrift.station) return 0;
  return (gainDrift.gainPerDay * Math.max(0, gainDrift.fromHoursAgo - hoursAgo)) / 24;
}

function isCoarse(station: string, hoursAgo: number): boolean {
  const { coarseRange } = stories;
  return (
    station === coarseRange.station &&
    hoursAgo <= coarseRange.fromHoursAgo &&
    hoursAgo >= coarseRange.untilHoursAgo
  );
}

/** Volts lost in the fixture's contacts at this insertion. */
function worn(station: string, fixture: string, hoursAgo: number, random: RandomSource): number {
  const { poorContact } = stories;
  const isWorn =
    station === poorContact.station &&
    fixture === poorContact.fixture &&
    hoursAgo <= poorContact.fromHoursAgo &&
    random.chance(poorContact.insertionShare);
  return isWorn ? random.between(poorContact.lostVolts[0], poorContact.lostVolts[1]) : 0;
}
