import { lastDays } from './site-days';

export const stepNames = { hour: 'hour', day: 'day', week: 'week' } as const;
export type Step = keyof typeof stepNames;

export const splitNames = {
  product: 'product',
  stage: 'stage',
  station: 'station',
  fixture: 'fixture',
  lot: 'lot',
  programVersion: 'program version',
} as const;
export type Split = keyof typeof splitNames;

export const filterKeys = ['partNumber', 'stage', 'station', 'fixture', 'lot', 'programVersion'] as const;
type FilterKey = (typeof filterKeys)[number];

/** What the Yield page asks for; the same names stand in its address. */
export interface YieldQuery extends Partial<Record<FilterKey, string>> {
  /** Site days, both included. */
  from: string;
  to: string;
  by: Step;
  split?: Split;
}

/** The filter that narrows a report to one group of a split. */
export const filterOfSplit: Record<Split, FilterKey> = {
  product: 'partNumber',
  stage: 'stage',
  station: 'station',
  fixture: 'fixture',
  lot: 'lot',
  programVersion: 'programVersion',
};

const DEFAULT_DAYS = 14;
const DAY_FORM = /^\d{4}-\d{2}-\d{2}$/;
const isStep = (value: string): value is Step => value in stepNames;
const isSplit = (value: string): value is Split => value in splitNames;

/** Reads a question from an address; what is missing or unknown becomes: the last 14 days, by day, everything. */
export function readYieldQuery(search: URLSearchParams, today: string): YieldQuery {
  const text = (key: string) => search.get(key)?.trim() ?? '';
  const day = (key: string, otherwise: string) => (DAY_FORM.test(text(key)) ? text(key) : otherwise);
  const to = day('to', today);
  const query: YieldQuery = {
    from: day('from', lastDays(DEFAULT_DAYS, to).from),
    to,
    by: isStep(text('by')) ? (text('by') as Step) : 'day',
  };
  if (isSplit(text('split'))) query.split = text('split') as Split;
  for (const key of filterKeys) if (text(key)) query[key] = text(key);
  return query;
}

export const filtersOf = (query: YieldQuery): Partial<Record<FilterKey, string>> =>
  Object.fromEntries(filterKeys.filter((key) => query[key]).map((key) => [key, query[key]]));

export const isFiltered = (query: YieldQuery): boolean => filterKeys.some((key) => query[key] !== undefined);

/** The question in words, as it stands above the figures and on paper. */
export function describeQuery(query: YieldQuery, timeZone: string): string {
  const names: Record<FilterKey, string> = {
    partNumber: '',
    stage: 'stage ',
    station: 'station ',
    fixture: 'fixture ',
    lot: 'lot ',
    programVersion: 'program ',
  };
  const filters = filterKeys.flatMap((key) => (query[key] ? [`${names[key]}${query[key]}`] : []));
  const what = filters.length > 0 ? filters.join(', ') : 'All products and stages';
  return `${what}, first attempts from ${dayText(query.from)} to ${dayText(query.to)}, by ${query.by}, days of ${timeZone}.`;
}

const dayText = (day: string): string => {
  const date = new Date(`${day}T00:00:00Z`);
  return Number.isNaN(date.getTime())
    ? day
    : new Intl.DateTimeFormat('en-GB', {
        day: 'numeric',
        month: 'short',
        year: 'numeric',
        timeZone: 'UTC',
      }).format(date);
};
