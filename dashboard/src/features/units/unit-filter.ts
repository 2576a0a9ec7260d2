import type { Verdict } from '@/types/api';
import { verdictNames } from '@/utils/verdict-names';

/** What the Units page can ask for; the same names stand in its address. */
export interface UnitFilter {
  search?: string;
  partNumber?: string;
  lot?: string;
  stage?: string;
  station?: string;
  verdict?: Verdict;
  cursor?: string;
}

const TEXT_KEYS = ['search', 'partNumber', 'lot', 'stage', 'station', 'cursor'] as const;

const isVerdict = (value: string): value is Verdict => value in verdictNames;

/** Reads a filter from an address; what it doesn't know is left out. */
export function readUnitFilter(search: URLSearchParams): UnitFilter {
  const filter: UnitFilter = {};
  for (const key of TEXT_KEYS) {
    const value = search.get(key)?.trim();
    if (value) filter[key] = value;
  }
  const verdict = search.get('verdict') ?? '';
  if (isVerdict(verdict)) filter.verdict = verdict;
  return filter;
}

export const isFiltered = ({ cursor: _, ...filter }: UnitFilter): boolean => Object.keys(filter).length > 0;
