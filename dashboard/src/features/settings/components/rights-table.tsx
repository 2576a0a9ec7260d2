import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { roleNames } from '@/lib/session';
import type { Right, Role } from '@/types/api';
import styles from './rights-table.module.css';

/** A square where they may; nothing where they may not. */
const mayMark = (isAllowed: boolean) =>
  isAllowed && (
    <span className={styles.may}>
      <svg width="12" height="12" viewBox="0 0 16 16" role="img" aria-label="may">
        <rect x="2" y="2" width="12" height="12" fill="currentColor" />
      </svg>
    </span>
  );

const columns: DataColumn<Right>[] = [
  {
    key: 'what',
    head: 'What',
    isRowHead: true,
    cell: ({ summary, method, path, access }) => (
      <span className={styles.what}>
        {summary || path}
        {access === 'public' && <span className={styles.anyone}> (anyone, signed in or not)</span>}
        <code className={styles.route}>
          {method} {path}
        </code>
      </span>
    ),
  },
  ...(Object.keys(roleNames) as Role[]).map((role): DataColumn<Right> => ({
    key: role,
    head: roleNames[role],
    cell: ({ access, roles }) => mayMark(access === 'public' || roles.includes(role)),
  })),
  {
    key: 'station',
    head: 'Station key',
    cell: ({ access }) => mayMark(access === 'public' || access === 'station'),
  },
];

/** The server's one table of who may do what. */
export function RightsTable({ rights }: { rights: Right[] }) {
  return (
    <DataTable
      caption="Who may do what"
      columns={columns}
      rows={rights}
      rowKey={({ method, path }) => `${method} ${path}`}
    />
  );
}
