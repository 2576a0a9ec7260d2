import { ConfirmAction } from '@/components/ui/confirm-action';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { LabelTag } from '@/components/ui/label-tag';
import { TimeText } from '@/components/ui/time-text';
import { useHasRole } from '@/lib/session';
import { useToast } from '@/lib/toasts';
import type { ApiKey } from '@/types/api';
import { useRevokeKey } from '../api/revoke-key';
import { mayConnectStations } from '../station-roles';
import styles from './key-table.module.css';

const columns: DataColumn<ApiKey>[] = [
  {
    key: 'label',
    head: 'Label',
    isRowHead: true,
    cell: (key) => (
      <span className={key.state === 'active' ? undefined : styles.dead}>
        {key.label} {key.practice && <LabelTag>practice</LabelTag>}
      </span>
    ),
  },
  {
    key: 'prefix',
    head: 'Begins with',
    isTight: true,
    cell: ({ prefix }) => <code>amk_{prefix}_</code>,
  },
  { key: 'state', head: 'State', isSelfExplaining: true, cell: (key) => <KeyState apiKey={key} /> },
  {
    key: 'used',
    head: 'Last used',
    isTight: true,
    cell: ({ lastUsedAt }) => <TimeText at={lastUsedAt} show="relative" none="never" />,
  },
  {
    key: 'created',
    head: 'Created',
    cell: (key) => (
      <>
        <TimeText at={key.createdAt} show="date" /> by {key.createdBy}
      </>
    ),
  },
];

function KeyState({ apiKey: { state, expiresAt, revokedAt } }: { apiKey: ApiKey }) {
  if (state === 'revoked') {
    return (
      <>
        Revoked <TimeText at={revokedAt} show="date" />
      </>
    );
  }
  if (state === 'expired') {
    return (
      <>
        Expired <TimeText at={expiresAt} show="date" />
      </>
    );
  }
  if (expiresAt === null) return <>Active</>;
  return (
    <>
      Active until <TimeText at={expiresAt} show="date" />
    </>
  );
}

/** A station's keys, with the way to end them for those who may. */
export function KeyTable({ station, keys }: { station: string; keys: ApiKey[] }) {
  const mayRevoke = useHasRole(...mayConnectStations);
  const revokeColumn: DataColumn<ApiKey> = {
    key: 'revoke',
    head: <span className="visually-hidden">Revoke</span>,
    align: 'end',
    isTight: true,
    cell: (key) => (key.state === 'active' ? <RevokeKey station={station} apiKey={key} /> : null),
  };
  return (
    <DataTable
      caption={`API keys of ${station}`}
      columns={mayRevoke ? [...columns, revokeColumn] : columns}
      rows={keys}
      rowKey={({ keyId }) => String(keyId)}
    />
  );
}

function RevokeKey({ station, apiKey }: { station: string; apiKey: ApiKey }) {
  const revoke = useRevokeKey(station);
  const toast = useToast();
  const confirm = async () => {
    await revoke.mutateAsync({ params: { path: { station, keyId: apiKey.keyId } } });
    toast({ kind: 'success', text: `The key “${apiKey.label}” is revoked.` });
  };
  return (
    <ConfirmAction
      label="Revoke"
      title={`Revoke the key “${apiKey.label}” of ${station}?`}
      confirmLabel="Revoke key"
      onConfirm={confirm}
      size="small"
    >
      The next post with it is refused. This cannot be taken back: a station that still uses it needs a new
      key.
    </ConfirmAction>
  );
}
