import { QueryCache, QueryClient } from '@tanstack/react-query';
import { isApiError } from './api-error';
import { sessionOptions } from './session';

const RETRIES = 2;

/** Only what may heal by itself is tried again; a refusal stays a refusal. */
function shouldRetry(failures: number, error: unknown): boolean {
  return failures < RETRIES && isApiError(error) && (error.status === 0 || error.status >= 500);
}

export function createQueryClient(): QueryClient {
  const client: QueryClient = new QueryClient({
    defaultOptions: {
      queries: { staleTime: 15_000, retry: shouldRetry, refetchOnWindowFocus: true },
      mutations: { retry: false },
    },
    queryCache: new QueryCache({
      // A session that ended elsewhere: forget who was signed in, and the shell asks again.
      onError: (error) => {
        if (isApiError(error) && error.status === 401) client.setQueryData(sessionOptions().queryKey, null);
      },
    }),
  });
  return client;
}
