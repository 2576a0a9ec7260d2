import { useQuery } from '@tanstack/react-query';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { RoleNote } from '@/components/ui/role-note';
import { Section } from '@/components/ui/section';
import { useHasRole } from '@/lib/session';
import { keysOptions } from '../api/get-keys';
import { mayConnectStations, maySeeKeys } from '../station-roles';
import { CreateKey } from './create-key';
import { KeyTable } from './key-table';

/** What the station proves itself with. */
export function KeySection({ station }: { station: string }) {
  const maySee = useHasRole(...maySeeKeys);
  const mayCreate = useHasRole(...mayConnectStations);
  return (
    <Section title="API keys" actions={mayCreate && <CreateKey station={station} />}>
      {maySee ? <Keys station={station} /> : <RoleNote roles={maySeeKeys} act="see a station’s keys" />}
      {maySee && <RoleNote roles={mayConnectStations} act="create and revoke keys" />}
    </Section>
  );
}

function Keys({ station }: { station: string }) {
  const { data, error, refetch } = useQuery(keysOptions(station));
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Loading label="the keys" lines={3} />;
  if (data.length > 0) return <KeyTable station={station} keys={data} />;
  return (
    <EmptyState title="This station has no key yet.">
      Without one it cannot post. A practice key is a good start: its results are judged and shown, but never
      counted.
    </EmptyState>
  );
}
