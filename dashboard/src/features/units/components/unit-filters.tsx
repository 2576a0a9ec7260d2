import { useQuery } from '@tanstack/react-query';
import { useId } from 'react';
import { Button } from '@/components/ui/button';
import { DateField } from '@/components/ui/date-field';
import { SearchField } from '@/components/ui/search-field';
import { SelectField } from '@/components/ui/select-field';
import { productsOptions } from '@/lib/get-products';
import { stationsOptions } from '@/lib/get-stations';
import { useSearchChange } from '@/lib/use-search-change';
import type { Verdict } from '@/types/api';
import { measureName, measures } from '@/utils/measure-names';
import { verdictNames } from '@/utils/verdict-names';
import { filterKeys, isFiltered, type UnitFilter } from '../unit-filter';
import styles from './unit-filters.module.css';

const any = { value: '', label: 'any' };
const asOptions = (values: string[]) => [any, ...values.map((value) => ({ value, label: value }))];
const verdictOptions = [
  any,
  ...(Object.keys(verdictNames) as Verdict[]).map((value) => ({ value, label: verdictNames[value] })),
];

const askedOptions: { value: '' | 'firstAttempt'; label: string }[] = [
  { value: '', label: 'latest result' },
  { value: 'firstAttempt', label: 'first attempt' },
];
const measureOptions = [any, ...measures.map((value) => ({ value, label: measureName(value) }))];
const noFilter = Object.fromEntries([...filterKeys, 'open'].map((key): [string, string] => [key, '']));

/** Search and filters; everything goes into the address, so that a link shows a colleague the same list. */
export function UnitFilters({ filter }: { filter: UnitFilter }) {
  const change = useSearchChange();
  const { partNumbers, stages, stations } = useChoices(filter);
  const headingId = useId();
  return (
    <search aria-labelledby={headingId}>
      <h2 id={headingId} className="visually-hidden">
        Search and filters
      </h2>
      <div className={styles.filters}>
        <SearchField
          label="Serial number"
          name="search"
          value={filter.search ?? ''}
          placeholder="type or scan"
        />
        <SelectField
          label="Part number"
          value={filter.partNumber ?? ''}
          options={asOptions(partNumbers)}
          onChange={(partNumber) => change({ partNumber })}
        />
        <SearchField label="Lot" name="lot" value={filter.lot ?? ''} />
        <SelectField
          label="Stage"
          value={filter.stage ?? ''}
          options={asOptions(stages)}
          onChange={(stage) => change({ stage })}
        />
        <SelectField
          label="Verdict"
          value={filter.verdict ?? ''}
          options={verdictOptions}
          onChange={(verdict) => change({ verdict })}
        />
        <SelectField
          label="Station"
          value={filter.station ?? ''}
          options={asOptions(stations)}
          onChange={(station) => change({ station })}
        />
        <DateField label="From" value={filter.from ?? ''} onChange={(from) => change({ from })} />
        <DateField
          label="To"
          value={filter.to ?? ''}
          {...(filter.from && { min: filter.from })}
          onChange={(to) => change({ to })}
        />
        <SelectField
          label="By"
          value={filter.of ?? ''}
          options={askedOptions}
          onChange={(of) => change({ of })}
        />
        <SelectField
          label="Failed measure"
          value={filter.failedMeasure ?? ''}
          options={measureOptions}
          onChange={(failedMeasure) => change({ failedMeasure })}
        />
        <SearchField label="Fixture" name="fixture" value={filter.fixture ?? ''} />
        <SearchField label="Program version" name="programVersion" value={filter.programVersion ?? ''} />
        {isFiltered(filter) && (
          <div className={styles.clear}>
            <Button kind="quiet" onClick={() => change(noFilter)}>
              Show all units
            </Button>
          </div>
        )}
      </div>
    </search>
  );
}

/** What can be chosen, with what the address asks for even when the site no longer has it. */
function useChoices(filter: UnitFilter) {
  const { data: products = [] } = useQuery(productsOptions());
  const { data: stations = [] } = useQuery(stationsOptions());
  const withAsked = (values: string[], asked?: string) =>
    [...new Set(asked ? [...values, asked] : values)].sort();
  return {
    partNumbers: withAsked(
      products.map(({ partNumber }) => partNumber),
      filter.partNumber,
    ),
    stages: withAsked(
      products.flatMap((product) => product.stages.map(({ stage }) => stage)),
      filter.stage,
    ),
    stations: withAsked(
      stations.map(({ station }) => station),
      filter.station,
    ),
  };
}
