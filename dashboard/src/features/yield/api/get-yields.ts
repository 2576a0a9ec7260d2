import { keepPreviousData } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import type { YieldQuery } from '../yield-query';

const REFRESH_MS = 60_000;

/** A trend over weeks moves slowly: it is asked for anew each minute, not with every result. */
export const yieldsOptions = (query: YieldQuery) =>
  $api.queryOptions(
    'get',
    '/api/v1/yields',
    { params: { query } },
    { placeholderData: keepPreviousData, refetchInterval: REFRESH_MS },
  );
