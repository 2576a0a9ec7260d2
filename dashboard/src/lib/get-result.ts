import { $api } from './api-client';

/** One result with its sweep and judging; used by the unit's page and by the first post of a new station. */
export const resultOptions = (resultId: string) =>
  $api.queryOptions('get', '/api/v1/results/{resultId}', { params: { path: { resultId } } });
