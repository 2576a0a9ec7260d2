import { useQuery } from '@tanstack/react-query';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { ProductLimits } from '@/features/limits/components/product-limits';
import { productsOptions } from '@/lib/get-products';

export function LimitsRoute() {
  const { data, error, refetch } = useQuery(productsOptions());
  return (
    <>
      <PageHeader
        title="Limits"
        lead="What each product has to prove, stage by stage: the test plan and the limits in force now. U is the expanded uncertainty (95 %) of the measured figure."
      />
      {error && !data && <ErrorState error={error} onRetry={() => void refetch()} />}
      {!data && !error && <Loading label="the limits" lines={12} />}
      {data?.length === 0 && (
        <EmptyState title="No product is set up yet.">
          Products, test plans and limits come from the site&apos;s set-up file.
        </EmptyState>
      )}
      {data?.map((product) => (
        <ProductLimits key={product.partNumber} product={product} />
      ))}
    </>
  );
}
