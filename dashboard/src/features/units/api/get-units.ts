import { keepPreviousData } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import type { UnitFilter } from '../unit-filter';

/** The page before stays on screen until the next one is there. */
export const unitsOptions = (filter: UnitFilter) =>
  $api.queryOptions(
    'get',
    '/api/v1/units',
    { params: { query: filter } },
    { placeholderData: keepPreviousData },
  );
