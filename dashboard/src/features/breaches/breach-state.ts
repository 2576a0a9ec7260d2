import type { Breach } from '@/types/api';

export type BreachFilter = Breach['state'] | 'all';

export const breachFilters: readonly { value: BreachFilter; label: string }[] = [
  { value: 'open', label: 'Open' },
  { value: 'acknowledged', label: 'Acknowledged' },
  { value: 'closed', label: 'Closed' },
  { value: 'all', label: 'All' },
];

/** What the address asks for; what still waits for somebody when it asks for nothing known. */
export function readBreachFilter(search: URLSearchParams): BreachFilter {
  return breachFilters.find(({ value }) => value === search.get('state'))?.value ?? 'open';
}

export const stateWords: Record<Breach['state'], string> = {
  open: 'Open, nobody has it yet',
  acknowledged: 'Acknowledged',
  closed: 'Closed',
};

export const eventsInWords = (count: number): string => `${count} ${count === 1 ? 'result' : 'results'}`;
