import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { TimeText } from '@/components/ui/time-text';
import type { AuditEntry } from '@/types/api';
import { deedInWords } from '../audit-words';
import styles from './audit-table.module.css';

const columns: DataColumn<AuditEntry>[] = [
  {
    key: 'who',
    head: 'Who',
    isRowHead: true,
    isTight: true,
    cell: ({ actor }) => actor,
  },
  { key: 'what', head: 'Did', isSelfExplaining: true, cell: ({ action }) => deedInWords(action) },
  {
    key: 'subject',
    head: 'To',
    isSelfExplaining: true,
    // Who signs in does it to nobody else.
    cell: ({ subject, actor }) => (subject === actor ? '' : subject),
  },
  {
    key: 'detail',
    head: 'Detail',
    isSelfExplaining: true,
    cell: ({ detail }) => detail && <span className={styles.detail}>{detail}</span>,
  },
  {
    key: 'at',
    head: 'When',
    align: 'end',
    isTight: true,
    isSelfExplaining: true,
    cell: ({ at }) => <TimeText at={at} show="full" />,
  },
];

export function AuditTable({ entries }: { entries: AuditEntry[] }) {
  return (
    <DataTable
      caption="Audit trail"
      columns={columns}
      rows={entries}
      rowKey={({ auditId }) => String(auditId)}
    />
  );
}
