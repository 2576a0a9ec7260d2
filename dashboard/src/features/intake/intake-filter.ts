export type IntakeKind = 'all' | 'accepted' | 'refused';

/** What the Intake page can ask for; the same names stand in its address. */
export interface IntakeFilter {
  kind: IntakeKind;
  station?: string;
  cursor?: string;
}

export const intakeKinds: readonly { value: IntakeKind; label: string }[] = [
  { value: 'all', label: 'All' },
  { value: 'accepted', label: 'Accepted' },
  { value: 'refused', label: 'Refused' },
];

/** Reads a filter from an address; what it doesn't know is left out. */
export function readIntakeFilter(search: URLSearchParams): IntakeFilter {
  const filter: IntakeFilter = {
    kind: intakeKinds.find(({ value }) => value === search.get('kind'))?.value ?? 'all',
  };
  const station = search.get('station')?.trim();
  if (station) filter.station = station;
  const cursor = search.get('cursor');
  if (cursor) filter.cursor = cursor;
  return filter;
}
