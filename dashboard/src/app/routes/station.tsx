import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { paths } from '@/config/paths';
import { StationPage } from '@/features/stations/components/station-page';
import { stationsOptions } from '@/lib/get-stations';

export function StationRoute() {
  const { station: name = '' } = useParams();
  const { data, error, refetch } = useQuery(stationsOptions());
  const station = data?.find((one) => one.station === name);
  if (station) return <StationPage key={station.station} station={station} />;
  return (
    <>
      <PageHeader title={name} lead={<Link to={paths.stations()}>All stations</Link>} />
      {error && !data ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : data ? (
        <EmptyState title={`There is no station “${name}”.`}>
          Names never change; check the address.
        </EmptyState>
      ) : (
        <Loading label="the station" />
      )}
    </>
  );
}
