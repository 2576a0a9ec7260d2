import type { StageName } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import type { Shift } from '../history/shift-calendar.js';

/** Which stations test which stage on which line of Fernhollow Controls. */
export const lineStations: Readonly<Record<LineName, Readonly<Record<StageName, readonly string[]>>>> = {
  north: { board: ['north-1', 'north-2'], final: ['north-3', 'north-4'] },
  south: { board: ['south-1'], final: ['south-2'] },
};

export type LineName = 'north' | 'south';

/** What is made where, the more often named the more of it. */
export const productMix: readonly [MixEntry, ...MixEntry[]] = [
  { partNumber: 'FH-R500-W', line: 'north' },
  { partNumber: 'FH-R500-W', line: 'north' },
  { partNumber: 'FH-R500-M', line: 'north' },
  { partNumber: 'FH-T250-C', line: 'north' },
  { partNumber: 'FH-T250-C', line: 'south' },
  { partNumber: 'FH-B15K-A', line: 'south' },
];

export interface MixEntry {
  partNumber: string;
  line: LineName;
}

/** Badge codes by shift. */
export const operators: Readonly<Record<Shift, readonly [string, ...string[]]>> = {
  early: ['B104', 'B117', 'B126'],
  late: ['B122', 'B131'],
  off: ['B140'],
};

export const abortReasons: readonly [string, ...string[]] = ['guard opened', 'operator stopped the run'];

/** Units that are released or held together. */
export const LOT_SIZE = 40;

/** Hours after which a station owes another check with a golden unit. */
export const GOLDEN_CHECK_HOURS = 24;
