import { keepPreviousData } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import type { IntakeFilter } from '../intake-filter';

export const intakeOptions = (filter: IntakeFilter) =>
  $api.queryOptions(
    'get',
    '/api/v1/intake',
    { params: { query: filter } },
    { placeholderData: keepPreviousData },
  );
