import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { LabelTag } from '@/components/ui/label-tag';
import { TimeText } from '@/components/ui/time-text';
import { roleNames, useUser } from '@/lib/session';
import type { User } from '@/types/api';
import { AccountSwitch } from './account-switch';
import styles from './account-table.module.css';
import { ChangeAccount } from './change-account';

const columns: DataColumn<User>[] = [
  { key: 'name', head: 'Name', isRowHead: true, cell: (user) => <NameOf user={user} /> },
  { key: 'email', head: 'Email', isSelfExplaining: true, cell: ({ email }) => email },
  { key: 'role', head: 'Role', isSelfExplaining: true, cell: ({ role }) => roleNames[role] },
  {
    key: 'state',
    head: 'State',
    isSelfExplaining: true,
    cell: ({ active }) => (active ? 'active' : 'disabled'),
  },
  {
    key: 'last',
    head: 'Last sign-in',
    isTight: true,
    cell: ({ lastSignInAt }) => <TimeText at={lastSignInAt} show="relative" none="never" />,
  },
  {
    key: 'acts',
    head: <span className="visually-hidden">Change</span>,
    align: 'end',
    isTight: true,
    cell: (user) => (
      <span className={styles.acts}>
        <ChangeAccount user={user} />
        <AccountSwitch user={user} />
      </span>
    ),
  },
];

function NameOf({ user }: { user: User }) {
  const isOwn = useUser().userId === user.userId;
  return (
    <span className={user.active ? undefined : styles.disabled}>
      {user.displayName} {isOwn && <LabelTag>you</LabelTag>}
    </span>
  );
}

export function AccountTable({ users }: { users: User[] }) {
  return (
    <DataTable caption="Accounts" columns={columns} rows={users} rowKey={({ userId }) => String(userId)} />
  );
}
