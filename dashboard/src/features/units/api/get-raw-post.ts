import { queryOptions } from '@tanstack/react-query';
import { api } from '@/lib/api-client';

const path = '/api/v1/results/{resultId}/post';

/** The post exactly as the station sent it, as text. */
export const rawPostOptions = (resultId: string) =>
  queryOptions({
    queryKey: ['get', path, resultId],
    queryFn: async () => {
      const { data } = await api.GET(path, { params: { path: { resultId } }, parseAs: 'text' });
      return data ?? '';
    },
    staleTime: Infinity,
  });
