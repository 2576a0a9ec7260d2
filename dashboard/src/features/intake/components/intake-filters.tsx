import { useQuery } from '@tanstack/react-query';
import { LinkTabs } from '@/components/ui/link-tabs';
import { SelectField } from '@/components/ui/select-field';
import { paths } from '@/config/paths';
import { stationsOptions } from '@/lib/get-stations';
import { useSearchChange } from '@/lib/use-search-change';
import { intakeKinds, type IntakeFilter } from '../intake-filter';
import styles from './intake-filters.module.css';

/** Kind and station; both go into the address. */
export function IntakeFilters({ filter: { kind, station = '' } }: { filter: IntakeFilter }) {
  const change = useSearchChange();
  const { data: stations = [] } = useQuery(stationsOptions());
  const names = [...new Set([...stations.map((one) => one.station), ...(station ? [station] : [])])].sort();
  return (
    <div className={styles.filters}>
      <LinkTabs
        label="Posts by kind"
        tabs={intakeKinds.map(({ value, label }) => ({
          label,
          to: paths.intake({ ...(value === 'all' ? {} : { kind: value }), ...(station ? { station } : {}) }),
          isCurrent: value === kind,
        }))}
      />
      <SelectField
        label="Station"
        value={station}
        options={[{ value: '', label: 'any' }, ...names.map((name) => ({ value: name, label: name }))]}
        onChange={(name) => change({ station: name })}
      />
    </div>
  );
}
