import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { yieldsOptions } from '@/features/yield/api/get-yields';
import { YieldFilters } from '@/features/yield/components/yield-filters';
import { YieldPage } from '@/features/yield/components/yield-page';
import { siteDay } from '@/features/yield/site-days';
import { describeQuery, readYieldQuery } from '@/features/yield/yield-query';
import { productsOptions } from '@/lib/get-products';
import { useNow } from '@/lib/now';
import { useSite } from '@/lib/site';

export function YieldRoute() {
  const [search] = useSearchParams();
  const { timeZone } = useSite();
  const today = siteDay(useNow(), timeZone);
  const query = readYieldQuery(search, today);
  const { data, error, refetch, isPlaceholderData } = useQuery(yieldsOptions(query));
  const { data: products = [] } = useQuery(productsOptions());
  return (
    <>
      <PageHeader title="Yield" lead={describeQuery(query, timeZone)} />
      <YieldFilters query={query} today={today} />
      {error && (!data || isPlaceholderData) ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : data ? (
        <YieldPage report={data} query={query} products={products} isPending={isPlaceholderData} />
      ) : (
        <Loading label="the yields" lines={14} />
      )}
    </>
  );
}
