import { useQuery } from '@tanstack/react-query';
import { useId } from 'react';
import { Button } from '@/components/ui/button';
import { DateField } from '@/components/ui/date-field';
import { SearchField } from '@/components/ui/search-field';
import { SelectField } from '@/components/ui/select-field';
import { productsOptions } from '@/lib/get-products';
import { stationsOptions } from '@/lib/get-stations';
import { useSearchChange } from '@/lib/use-search-change';
import { lastDays } from '../site-days';
import {
  filterKeys,
  isFiltered,
  splitNames,
  stepNames,
  type Split,
  type Step,
  type YieldQuery,
} from '../yield-query';
import styles from './yield-filters.module.css';

const any = { value: '', label: 'any' };
const asOptions = (values: string[]) => [any, ...values.map((value) => ({ value, label: value }))];
const stepOptions = (Object.keys(stepNames) as Step[]).map((value) => ({ value, label: stepNames[value] }));
const splitOptions: { value: Split | ''; label: string }[] = [
  { value: '', label: 'nothing' },
  ...(Object.keys(splitNames) as Split[]).map((value) => ({ value, label: splitNames[value] })),
];
const PERIODS = [7, 14, 30, 60];
const noFilter = Object.fromEntries(filterKeys.map((key): [string, string] => [key, '']));

/** Period, step, split and filters; everything goes into the address, so that a link shows a colleague the same screen. */
export function YieldFilters({ query, today }: { query: YieldQuery; today: string }) {
  const change = useSearchChange();
  const { partNumbers, stages, stations } = useChoices(query);
  const headingId = useId();
  return (
    <search aria-labelledby={headingId} className="no-print">
      <h2 id={headingId} className="visually-hidden">
        Period and filters
      </h2>
      <div className={styles.filters}>
        <DateField label="From" value={query.from} onChange={(from) => change({ from })} />
        <DateField
          label="To"
          value={query.to}
          onChange={(to) => change({ to })}
          error={query.to < query.from ? 'lies before From' : null}
        />
        <SelectField label="By" value={query.by} options={stepOptions} onChange={(by) => change({ by })} />
        <SelectField
          label="Split by"
          value={query.split ?? ''}
          options={splitOptions}
          onChange={(split) => change({ split })}
        />
        <div className={styles.periods} role="group" aria-label="Last">
          {PERIODS.map((days) => (
            <Button key={days} kind="quiet" size="small" onClick={() => change(lastDays(days, today))}>
              {`${days} days`}
            </Button>
          ))}
        </div>
      </div>
      <div className={styles.filters}>
        <SelectField
          label="Part number"
          value={query.partNumber ?? ''}
          options={asOptions(partNumbers)}
          onChange={(partNumber) => change({ partNumber })}
        />
        <SelectField
          label="Stage"
          value={query.stage ?? ''}
          options={asOptions(stages)}
          onChange={(stage) => change({ stage })}
        />
        <SelectField
          label="Station"
          value={query.station ?? ''}
          options={asOptions(stations)}
          onChange={(station) => change({ station })}
        />
        <SearchField label="Lot" name="lot" value={query.lot ?? ''} />
        <SearchField label="Fixture" name="fixture" value={query.fixture ?? ''} />
        <SearchField label="Program version" name="programVersion" value={query.programVersion ?? ''} />
      </div>
      {isFiltered(query) && (
        <Button kind="quiet" onClick={() => change(noFilter)}>
          Take all filters away
        </Button>
      )}
    </search>
  );
}

/** What can be chosen, with what the address asks for even when the site no longer has it. */
function useChoices(query: YieldQuery) {
  const { data: products = [] } = useQuery(productsOptions());
  const { data: stations = [] } = useQuery(stationsOptions());
  const withAsked = (values: string[], asked?: string) =>
    [...new Set(asked ? [...values, asked] : values)].sort();
  return {
    partNumbers: withAsked(
      products.map(({ partNumber }) => partNumber),
      query.partNumber,
    ),
    stages: withAsked(
      products.flatMap((product) => product.stages.map(({ stage }) => stage)),
      query.stage,
    ),
    stations: withAsked(
      stations.map(({ station }) => station),
      query.station,
    ),
  };
}
