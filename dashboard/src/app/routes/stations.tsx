import { useQuery } from '@tanstack/react-query';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { RoleNote } from '@/components/ui/role-note';
import { AddStation } from '@/features/stations/components/add-station';
import { StationTable } from '@/features/stations/components/station-table';
import { mayConnectStations } from '@/features/stations/station-roles';
import { stationsOptions } from '@/lib/get-stations';
import { useHasRole } from '@/lib/session';

export function StationsRoute() {
  const mayAdd = useHasRole(...mayConnectStations);
  return (
    <>
      <PageHeader
        title="Stations"
        lead="What posts results: its state today, its clock, its instruments and its keys."
        actions={
          mayAdd ? <AddStation /> : <RoleNote roles={mayConnectStations} act="add stations and keys" />
        }
      />
      <Stations />
    </>
  );
}

function Stations() {
  const { data, error, refetch } = useQuery(stationsOptions());
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Loading label="the stations" />;
  if (data.length > 0) return <StationTable stations={data} />;
  return (
    <EmptyState title="No station yet.">
      A station needs a name and a key; then its program can post. Both are made here.
    </EmptyState>
  );
}
