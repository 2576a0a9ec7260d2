import { ammeterOnRange, voltmeter, type Ammeter, type Voltmeter } from './instruments.js';
import type { ProductFacts } from './product-facts.js';

/** A test station of the line; the errors are its instruments' true ones. */
export interface StationFacts {
  station: string;
  line: string;
  ammeterSerialNumber: string;
  ammeterGainError: number;
  voltmeterSerialNumber: string;
  voltmeterGainError: number;
  fixtures: readonly [string, ...string[]];
}

export const stations: readonly [StationFacts, ...StationFacts[]] = [
  station('north-1', 'AM-0031', 0.00004, 'VM-0107', 0.00002),
  station('north-2', 'AM-0032', -0.00006, 'VM-0108', -0.00003),
  station('north-3', 'AM-0034', 0.00002, 'VM-0110', 0.00001),
  station('north-4', 'AM-0037', -0.00003, 'VM-0111', 0.00004),
  station('south-1', 'AM-0041', 0.00005, 'VM-0115', -0.00002),
  station('south-2', 'AM-0042', -0.00001, 'VM-0116', 0.00003),
];

function station(
  name: string,
  ammeterSerialNumber: string,
  ammeterGainError: number,
  voltmeterSerialNumber: string,
  voltmeterGainError: number,
): StationFacts {
  return {
    station: name,
    line: name.split('-')[0] ?? name,
    ammeterSerialNumber,
    ammeterGainError,
    voltmeterSerialNumber,
    voltmeterGainError,
    fixtures: ['1', '2'],
  };
}

/** @throws RangeError for a station the line does not have */
export function stationByName(name: string): StationFacts {
  const found = stations.find((candidate) => candidate.station === name);
  if (!found) throw new RangeError(`No station ${name}`);
  return found;
}

/** A station set up for one product: meters on their ranges, one fixture, the state they are in. */
export interface Bench {
  station: string;
  fixture: string;
  ammeter: Ammeter;
  voltmeter: Voltmeter;
  /** Resistance of the fixture's contacts in Ω, outside the voltmeter's leads. */
  contactOhms: number;
}

/** What a story changes on a station. */
export interface BenchState {
  fixture?: string;
  /** Gain error on top of the ammeter's own, as a fraction. */
  gainDrift?: number;
  /** A range left behind by another job. */
  rangeAmps?: number;
  contactOhms?: number;
}

export function benchFor(facts: StationFacts, product: ProductFacts, state: BenchState = {}): Bench {
  const ammeter = {
    serialNumber: facts.ammeterSerialNumber,
    gainError: facts.ammeterGainError + (state.gainDrift ?? 0),
  };
  return {
    station: facts.station,
    fixture: state.fixture ?? facts.fixtures[0],
    ammeter: ammeterOnRange(ammeter, state.rangeAmps ?? product.ammeterRangeAmps),
    voltmeter: voltmeter(facts.voltmeterSerialNumber, facts.voltmeterGainError),
    contactOhms: state.contactOhms ?? 0.2,
  };
}
