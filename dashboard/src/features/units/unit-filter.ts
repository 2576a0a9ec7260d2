import type { Verdict } from '@/types/api';
import { verdictNames } from '@/utils/verdict-names';

/** What the Units page can ask for; the same names stand in its address. */
export interface UnitFilter {
  search?: string;
  partNumber?: string;
  lot?: string;
  /** Which result of a unit the filters below are about; the latest when left out. */
  of?: 'firstAttempt';
  /** Site days. */
  from?: string;
  to?: string;
  stage?: string;
  station?: string;
  fixture?: string;
  programVersion?: string;
  verdict?: Verdict;
  failedMeasure?: string;
  cursor?: string;
}

const TEXT_KEYS = [
  'search',
  'partNumber',
  'lot',
  'stage',
  'station',
  'fixture',
  'programVersion',
  'failedMeasure',
  'cursor',
] as const;
const DAY_KEYS = ['from', 'to'] as const;
const DAY_FORM = /^\d{4}-\d{2}-\d{2}$/;

const isVerdict = (value: string): value is Verdict => value in verdictNames;

/** Reads a filter from an address; what it doesn't know is left out. */
export function readUnitFilter(search: URLSearchParams): UnitFilter {
  const filter: UnitFilter = {};
  for (const key of TEXT_KEYS) {
    const value = search.get(key)?.trim();
    if (value) filter[key] = value;
  }
  for (const key of DAY_KEYS) {
    const value = search.get(key) ?? '';
    if (DAY_FORM.test(value)) filter[key] = value;
  }
  if (search.get('of') === 'firstAttempt') filter.of = 'firstAttempt';
  const verdict = search.get('verdict') ?? '';
  if (isVerdict(verdict)) filter.verdict = verdict;
  return filter;
}

export const isFiltered = ({ cursor: _, ...filter }: UnitFilter): boolean => Object.keys(filter).length > 0;

/** Every name that a filter has in an address. */
export const filterKeys = [...TEXT_KEYS, ...DAY_KEYS, 'of', 'verdict'] as const;
