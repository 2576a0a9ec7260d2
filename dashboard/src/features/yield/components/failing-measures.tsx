import { Link } from 'react-router-dom';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { Section } from '@/components/ui/section';
import type { FailingMeasure, YieldReport } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import { unitsLink } from '../units-link';
import type { YieldQuery } from '../yield-query';
import styles from './failing-measures.module.css';

export interface FailingMeasuresProps {
  report: YieldReport;
  query: YieldQuery;
}

/** What first attempts failed on, the most frequent first, with the share of all failures up to each. */
export function FailingMeasures({ report, query }: FailingMeasuresProps) {
  const { failingMeasures } = report;
  const most = failingMeasures[0]?.units ?? 1;
  const columns: DataColumn<FailingMeasure>[] = [
    { key: 'measure', head: 'Measure', isRowHead: true, isTight: true, cell: ({ label }) => label },
    {
      key: 'bar',
      head: '',
      isSelfExplaining: true,
      cell: ({ units }) => (
        <span className={styles.bar} style={{ width: `${(units / most) * 100}%` }} aria-hidden />
      ),
    },
    {
      key: 'units',
      head: 'Units',
      align: 'end',
      isTight: true,
      cell: ({ measure, units }) => (
        <Link className="figures" to={unitsLink(query, query, { verdict: 'fail', failedMeasure: measure })}>
          {units}
        </Link>
      ),
    },
    {
      key: 'cumulative',
      head: 'Share up to here',
      align: 'end',
      isTight: true,
      cell: ({ cumulativeShare }) => <span className="figures">{percentText(cumulativeShare)}</span>,
    },
  ];
  return (
    <Section title="What fails" note="first attempts by failed measure; a unit that failed two counts twice">
      {failingMeasures.length > 0 ? (
        <DataTable
          caption="Failing measures, the most frequent first"
          columns={columns}
          rows={failingMeasures}
          rowKey={({ measure }) => measure}
        />
      ) : (
        <p className={styles.none}>No first attempt failed a measure in this period.</p>
      )}
    </Section>
  );
}
