import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { NotFound } from '@/components/errors/not-found';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { breachOptions } from '@/features/breaches/api/get-breach';
import { BreachPage } from '@/features/breaches/components/breach-page';

export function BreachRoute() {
  const breachId = Number(useParams().breachId);
  return Number.isSafeInteger(breachId) && breachId > 0 ? <Breach breachId={breachId} /> : <NotFound />;
}

function Breach({ breachId }: { breachId: number }) {
  const { data, error, refetch } = useQuery(breachOptions(breachId));
  if (data) return <BreachPage key={breachId} breach={data} />;
  return (
    <>
      <PageHeader title="Breach" />
      {error ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : (
        <Loading label="the breach" lines={10} />
      )}
    </>
  );
}
