import { keepPreviousData } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import type { BreachFilter } from '../breach-state';

export const breachesOptions = (state: BreachFilter, cursor: string | null) =>
  $api.queryOptions(
    'get',
    '/api/v1/breaches',
    { params: { query: cursor === null ? { state } : { state, cursor } } },
    { placeholderData: keepPreviousData },
  );
