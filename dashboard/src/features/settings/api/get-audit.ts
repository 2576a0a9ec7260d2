import { keepPreviousData } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';

export const auditOptions = (cursor: string | null) =>
  $api.queryOptions(
    'get',
    '/api/v1/audit',
    { params: { query: cursor === null ? {} : { cursor } } },
    { placeholderData: keepPreviousData },
  );
