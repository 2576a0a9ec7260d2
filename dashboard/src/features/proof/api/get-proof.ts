import { $api } from '@/lib/api-client';

/** Every request computes all cases anew, so it is asked for once and again only by a person. */
export const proofOptions = () =>
  $api.queryOptions('get', '/api/v1/proof', {}, { staleTime: Infinity, refetchOnReconnect: false });
