import { useQuery } from '@tanstack/react-query';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { todayOptions } from '@/features/today/api/get-today';
import { TodayPage } from '@/features/today/components/today-page';

export function TodayRoute() {
  const { data, error, refetch } = useQuery(todayOptions());
  if (data) return <TodayPage today={data} />;
  return (
    <>
      <PageHeader title="Today" />
      {error ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : (
        <Loading label="today's figures" lines={12} />
      )}
    </>
  );
}
