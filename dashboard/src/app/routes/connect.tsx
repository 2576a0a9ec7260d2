import { useQuery } from '@tanstack/react-query';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { ConnectPage } from '@/features/connect/components/connect-page';
import { FirstPost } from '@/features/connect/components/first-post';
import { productsOptions } from '@/lib/get-products';

export function ConnectRoute() {
  const { data, error, refetch } = useQuery(productsOptions());
  return (
    <ConnectPage>
      {data ? (
        <FirstPost products={data} />
      ) : error ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : (
        <Loading label="the example" lines={10} />
      )}
    </ConnectPage>
  );
}
