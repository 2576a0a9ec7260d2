import { Link } from 'react-router-dom';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { Section } from '@/components/ui/section';
import { YieldBar, YieldBarScale } from '@/components/ui/yield-bar';
import { paths } from '@/config/paths';
import type { Product, YieldGroup, YieldReport } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import type { YieldScale } from '@/utils/yield-scale';
import { groupTarget } from '../targets';
import { unitsLink } from '../units-link';
import { filterOfSplit, splitNames, type Split, type YieldQuery } from '../yield-query';
import { GroupTrend } from './group-trend';
import styles from './split-table.module.css';

export interface SplitTableProps {
  report: YieldReport;
  query: YieldQuery & { split: Split };
  products: Product[];
  scale: YieldScale;
}

/** Each group of the split on one scale: its interval, its own small trend before the whole's, its counts. */
export function SplitTable({ report, query, products, scale }: SplitTableProps) {
  const name = splitNames[query.split];
  const whole = report.buckets.map(({ firstPass }) => firstPass);
  const narrowed = ({ name: group }: YieldGroup): YieldQuery => {
    const { split: _, ...rest } = query;
    return group === null ? rest : { ...rest, [filterOfSplit[query.split]]: group };
  };
  const columns: DataColumn<YieldGroup>[] = [
    {
      key: 'group',
      head: name,
      isRowHead: true,
      isTight: true,
      cell: (group) =>
        group.name === null ? (
          <span className={styles.unnamed}>not said</span>
        ) : (
          <Link to={paths.yields({ ...narrowed(group) })}>{group.name}</Link>
        ),
    },
    {
      key: 'bar',
      head: <YieldBarScale scale={scale} />,
      headText: '',
      isSelfExplaining: true,
      cell: (group) => (
        <div className={styles.bar}>
          <YieldBar figures={group.firstPass} target={groupTarget(products, query, group)} scale={scale} />
        </div>
      ),
    },
    {
      key: 'first',
      head: 'First pass',
      align: 'end',
      isTight: true,
      cell: ({ firstPass }) => share(firstPass.share),
    },
    {
      key: 'trend',
      head: 'Trend, faint: whole',
      isTight: true,
      isSelfExplaining: true,
      cell: (group) => (
        <GroupTrend name={group.name ?? 'not said'} trend={group.buckets} whole={whole} scale={scale} />
      ),
    },
    { key: 'final', head: 'Final', align: 'end', isTight: true, cell: ({ final }) => share(final.share) },
    {
      key: 'units',
      head: 'Units',
      align: 'end',
      isTight: true,
      cell: ({ firstPass }) => <Count of={firstPass.total} />,
    },
    {
      key: 'notProven',
      head: 'Not proven',
      align: 'end',
      isTight: true,
      cell: (group) => (
        <Count
          of={group.notProven}
          to={group.name !== null && unitsLink(narrowed(group), query, { verdict: 'notProven' })}
        />
      ),
    },
    {
      key: 'failed',
      head: 'Fail',
      align: 'end',
      isTight: true,
      cell: (group) => (
        <Count
          of={group.failed}
          to={group.name !== null && unitsLink(narrowed(group), query, { verdict: 'fail' })}
        />
      ),
    },
  ];
  return (
    <Section
      title={`By ${name}`}
      note="the largest first; bar: 95 % interval, stroke: first-pass yield, flag: target"
    >
      <DataTable
        caption={`First-pass yield by ${name}`}
        columns={columns}
        rows={report.groups}
        rowKey={(group) => group.name ?? ''}
      />
    </Section>
  );
}

const share = (value: number | null) => (
  <span className="figures">{value === null ? '–' : percentText(value)}</span>
);

function Count({ of, to = false }: { of: number; to?: string | false }) {
  if (of === 0 || to === false) return <span className="figures">{of}</span>;
  return (
    <Link className="figures" to={to}>
      {of}
    </Link>
  );
}
