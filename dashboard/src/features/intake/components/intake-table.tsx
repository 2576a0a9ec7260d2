import { Link } from 'react-router-dom';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { TimeText } from '@/components/ui/time-text';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { paths } from '@/config/paths';
import type { IntakeItem } from '@/types/api';
import { statusInWords } from '../status-words';
import styles from './intake-table.module.css';

const columns: DataColumn<IntakeItem>[] = [
  { key: 'unit', head: 'Post', isRowHead: true, isTight: true, cell: (item) => <PostLink item={item} /> },
  {
    key: 'part',
    head: 'Part number',
    isTight: true,
    isSelfExplaining: true,
    cell: ({ partNumber }) => <span className="figures">{partNumber}</span>,
  },
  { key: 'station', head: 'Station', isTight: true, isSelfExplaining: true, cell: ({ station }) => station },
  {
    key: 'answer',
    head: 'Answer',
    isTight: true,
    isSelfExplaining: true,
    cell: (item) => (
      <span className={item.kind === 'refused' ? styles.refused : styles.accepted}>
        {statusInWords(item.status)}
      </span>
    ),
  },
  {
    key: 'outcome',
    head: 'Verdict or reason',
    isSelfExplaining: true,
    cell: (item) => <Outcome item={item} />,
  },
  {
    key: 'received',
    head: 'Received',
    align: 'end',
    isTight: true,
    isSelfExplaining: true,
    cell: (item) => <Received item={item} />,
  },
];

function PostLink({ item: { kind, intakeId, partNumber, serialNumber, resultId } }: { item: IntakeItem }) {
  if (kind === 'refused') {
    return (
      <Link to={paths.refusedPost(intakeId)} className={serialNumber ? 'figures' : undefined}>
        {serialNumber ?? 'no serial number'}
      </Link>
    );
  }
  if (partNumber === null || serialNumber === null) return <>–</>;
  return (
    <Link className="figures" to={paths.unit(partNumber, serialNumber, resultId ?? undefined)}>
      {serialNumber}
    </Link>
  );
}

/** What became of it: the verdict, or the first reason with its place. */
function Outcome({ item: { kind, verdict, errors } }: { item: IntakeItem }) {
  if (kind === 'accepted') return verdict && <VerdictMark verdict={verdict} />;
  const [first, ...others] = errors;
  if (!first) return <>see its page</>;
  return (
    <span className={styles.reason}>
      {first.pointer && <code>{first.pointer}</code>} {first.detail}
      {others.length > 0 && <span className={styles.more}> and {others.length} more</span>}
    </span>
  );
}

function Received({ item: { lastReceivedAt, count } }: { item: IntakeItem }) {
  return (
    <>
      {count > 1 && <span className={styles.more}>{count} times, last </span>}
      <TimeText at={lastReceivedAt} show="short" />
    </>
  );
}

export function IntakeTable({ items }: { items: IntakeItem[] }) {
  return <DataTable caption="Posts" columns={columns} rows={items} rowKey={({ intakeId }) => intakeId} />;
}
