import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { Pager } from '@/components/ui/pager';
import { paths } from '@/config/paths';
import { intakeOptions } from '@/features/intake/api/get-intake';
import { IntakeFilters } from '@/features/intake/components/intake-filters';
import { IntakeTable } from '@/features/intake/components/intake-table';
import { readIntakeFilter, type IntakeFilter } from '@/features/intake/intake-filter';

export function IntakeRoute() {
  const [search] = useSearchParams();
  const filter = readIntakeFilter(search);
  return (
    <>
      <PageHeader title="Intake" lead="Every post that came in with a valid key, newest first." />
      <IntakeFilters filter={filter} />
      <Posts filter={filter} />
    </>
  );
}

function Posts({ filter }: { filter: IntakeFilter }) {
  const { data, error, refetch } = useQuery(intakeOptions(filter));
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Loading label="the posts" lines={12} />;
  if (data.items.length === 0) return <NoPosts filter={filter} />;
  return (
    <>
      <IntakeTable items={data.items} />
      <Pager nextCursor={data.nextCursor} label="posts" />
    </>
  );
}

function NoPosts({ filter: { kind, station } }: { filter: IntakeFilter }) {
  const from = station ? ` from ${station}` : '';
  if (kind === 'refused') return <EmptyState title={`No post was refused${from}.`} />;
  return (
    <EmptyState title={`No post has come in${from} yet.`}>
      A station needs a key and an address: <Link to={paths.connect()}>the first post, step by step</Link>.
    </EmptyState>
  );
}
