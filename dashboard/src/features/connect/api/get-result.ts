import { $api } from '@/lib/api-client';

export const resultOptions = (resultId: string) =>
  $api.queryOptions('get', '/api/v1/results/{resultId}', { params: { path: { resultId } } });
