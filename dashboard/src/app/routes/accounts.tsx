import { useQuery } from '@tanstack/react-query';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { usersOptions } from '@/features/settings/api/get-users';
import { AccountTable } from '@/features/settings/components/account-table';
import { AddAccount } from '@/features/settings/components/add-account';
import { SettingsFrame } from '@/features/settings/components/settings-frame';
import { seesAccounts } from '@/features/settings/settings-tabs';

export function AccountsRoute() {
  return (
    <SettingsFrame
      title="Accounts"
      lead="Who may sign in. An account is disabled, never removed: the records name who did what."
      actions={<AddAccount />}
      roles={seesAccounts}
      act="see and change the accounts"
    >
      <Accounts />
    </SettingsFrame>
  );
}

function Accounts() {
  const { data, error, refetch } = useQuery(usersOptions());
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Loading label="the accounts" />;
  return <AccountTable users={data} />;
}
