import { $api } from '@/lib/api-client';

export const breachOptions = (breachId: number) =>
  $api.queryOptions('get', '/api/v1/breaches/{breachId}', { params: { path: { breachId } } });
