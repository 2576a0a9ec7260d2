import { Link } from 'react-router-dom';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import type { Verdict, YieldBucket, YieldReport } from '@/types/api';
import { bucketDays, bucketName } from '../bucket-names';
import { pointLink, unitsLink } from '../units-link';
import type { YieldQuery } from '../yield-query';
import { shareWords } from './trend-words';

export interface TrendTableProps {
  report: YieldReport;
  query: YieldQuery;
}

/** The trend's figures; steps without units are left out. Each name leads where its point leads. */
export function TrendTable({ report, query }: TrendTableProps) {
  const { buckets, by, timeZone, rolledThroughput } = report;
  const columns: DataColumn<YieldBucket>[] = [
    {
      key: 'step',
      head: by === 'week' ? 'Week' : by === 'day' ? 'Day' : 'Hour',
      isRowHead: true,
      isTight: true,
      cell: (bucket) => (
        <Link className="figures" to={pointLink(query, bucket, timeZone)}>
          {bucketName(bucket, by, timeZone)}
        </Link>
      ),
    },
    {
      key: 'first',
      head: 'First pass (95 %)',
      align: 'end',
      cell: ({ firstPass }) => <Share text={shareWords(firstPass)} />,
    },
    {
      key: 'final',
      head: 'Final (95 %)',
      align: 'end',
      cell: ({ final }) => <Share text={shareWords(final)} />,
    },
    ...(rolledThroughput
      ? [
          {
            key: 'rolled',
            head: 'All stages (95 %)',
            align: 'end' as const,
            cell: (bucket: YieldBucket) =>
              bucket.rolledThroughput && <Share text={shareWords(bucket.rolledThroughput)} />,
          },
        ]
      : []),
    {
      key: 'units',
      head: 'Units',
      align: 'end',
      cell: ({ firstPass }) => <Share text={String(firstPass.total)} />,
    },
    count('notProven', 'Not proven', ({ notProven }) => notProven),
    count('fail', 'Fail', ({ failed }) => failed),
    { key: 'open', head: 'Open', align: 'end', cell: ({ openUnits }) => <Share text={String(openUnits)} /> },
  ];

  function count(
    verdict: Verdict,
    head: string,
    of: (bucket: YieldBucket) => number,
  ): DataColumn<YieldBucket> {
    return {
      key: verdict,
      head,
      align: 'end',
      cell: (bucket) =>
        of(bucket) === 0 ? (
          <Share text="0" />
        ) : (
          <Link className="figures" to={unitsLink(query, bucketDays(bucket, timeZone), { verdict })}>
            {of(bucket)}
          </Link>
        ),
    };
  }

  return (
    <DataTable
      caption={`Yields by ${by}`}
      columns={columns}
      rows={buckets.filter(({ firstPass }) => firstPass.total > 0)}
      rowKey={({ startAt }) => startAt}
    />
  );
}

function Share({ text }: { text: string }) {
  return <span className="figures">{text}</span>;
}
