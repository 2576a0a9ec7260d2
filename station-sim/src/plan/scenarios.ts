import type { ProductFacts } from '../circuit/product-facts.js';
import type { RandomSource } from '../circuit/random.js';
import { stations, type BenchState } from '../circuit/stations.js';
import type { DrawOptions } from '../circuit/unit.js';

export const scenarios = [
  'steady',
  'one-fail',
  'drift',
  'bad-lot',
  'coarse-meter',
  'poor-contact',
  'outage',
] as const;
export type Scenario = (typeof scenarios)[number];

/** `drift`: gain error that each test of the plan adds to the ammeter, and the most it comes to. */
const GAIN_PER_TEST = 0.0002;
const MOST_GAIN = 0.02;

/** `bad-lot`: which product's units come from it, and the Early voltage of its transistors. */
const badLot = { partNumber: 'FH-R500-M', earlyVolts: 56 };

/** `coarse-meter`: the range that a job with more current left behind. */
const COARSE_RANGE_AMPS = 0.1;

/** `poor-contact`: the worn fixture, the share of insertions that it spoils, and what they lose. */
const poorContact = { fixture: '2', insertionShare: 0.45, lostVolts: [1.2, 3.5] } as const;

/** The station that a scenario troubles: the last that takes part. */
export function troubledStation(stationCount: number): string {
  return (stations[stationCount - 1] ?? stations[0]).station;
}

/** How a scenario bends the draw of a new unit. */
export function unitOptionsOf(scenario: Scenario, product: ProductFacts): DrawOptions {
  if (scenario === 'one-fail') return { defect: 'leakyTransistor' };
  const isBad = scenario === 'bad-lot' && product.partNumber === badLot.partNumber;
  return isBad ? { earlyVolts: badLot.earlyVolts } : {};
}

/** A test as far as the state of its station is concerned. */
export interface TestOnStation {
  scenario: Scenario;
  stationCount: number;
  station: string;
  fixture: string;
  /** Running number in the plan. */
  number: number;
}

/** What a scenario changes on the station at a test. */
export function benchStateOf(test: TestOnStation, product: ProductFacts, random: RandomSource): BenchState {
  if (test.station !== troubledStation(test.stationCount)) return {};
  switch (test.scenario) {
    case 'drift':
      return { gainDrift: Math.min(MOST_GAIN, GAIN_PER_TEST * test.number) };
    case 'coarse-meter':
      return { rangeAmps: COARSE_RANGE_AMPS };
    case 'poor-contact': {
      const isLost = test.fixture === poorContact.fixture && random.chance(poorContact.insertionShare);
      const [least, most] = poorContact.lostVolts;
      return isLost ? { contactOhms: random.between(least, most) / product.nominalAmps } : {};
    }
    default:
      return {};
  }
}
