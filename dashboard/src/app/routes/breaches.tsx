import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { LinkTabs } from '@/components/ui/link-tabs';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { Pager } from '@/components/ui/pager';
import { paths } from '@/config/paths';
import { breachesOptions } from '@/features/breaches/api/get-breaches';
import { breachFilters, readBreachFilter, type BreachFilter } from '@/features/breaches/breach-state';
import { BreachTable } from '@/features/breaches/components/breach-table';

export function BreachesRoute() {
  const [search] = useSearchParams();
  const state = readBreachFilter(search);
  return (
    <>
      <PageHeader title="Breaches" lead="What broke a limit and wants a person, one line a cause." />
      <LinkTabs
        label="Breaches by state"
        tabs={breachFilters.map(({ value, label }) => ({
          label,
          to: paths.breaches(value === 'open' ? {} : { state: value }),
          isCurrent: value === state,
        }))}
      />
      <Breaches state={state} cursor={search.get('cursor')} />
    </>
  );
}

function Breaches({ state, cursor }: { state: BreachFilter; cursor: string | null }) {
  const { data, error, refetch } = useQuery(breachesOptions(state, cursor));
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Loading label="the breaches" />;
  if (data.items.length === 0) return <NoBreach state={state} />;
  return (
    <>
      <BreachTable breaches={data.items} />
      <Pager nextCursor={data.nextCursor} label="breaches" />
    </>
  );
}

function NoBreach({ state }: { state: BreachFilter }) {
  if (state === 'open') {
    return (
      <EmptyState title="No breach is open.">
        When a unit breaks a released limit, a breach opens here and the quality leads get a mail.
      </EmptyState>
    );
  }
  return <EmptyState title={state === 'all' ? 'There was no breach yet.' : `No breach is ${state}.`} />;
}
