import { QueryClientProvider, useQuery, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { ErrorState } from '@/components/ui/error-state';
import { ToastProvider } from '@/components/ui/toast-provider';
import { SiteContext, siteOptions } from '@/lib/site';

/** What every page stands on: the query cache, the site's settings, the toasts. */
export function AppProvider({ client, children }: { client: QueryClient; children: ReactNode }) {
  return (
    <QueryClientProvider client={client}>
      <SiteProvider>
        <ToastProvider>{children}</ToastProvider>
      </SiteProvider>
    </QueryClientProvider>
  );
}

function SiteProvider({ children }: { children: ReactNode }) {
  const { data, error, refetch } = useQuery({
    ...siteOptions(),
    refetchInterval: ({ state }) => (state.data ? false : 5_000),
  });
  if (data) return <SiteContext.Provider value={data}>{children}</SiteContext.Provider>;
  if (!error) return null;
  return (
    <div style={{ padding: 'var(--space-5)' }}>
      <ErrorState error={error} title="Ampkeep does not answer" onRetry={() => void refetch()} />
    </div>
  );
}
