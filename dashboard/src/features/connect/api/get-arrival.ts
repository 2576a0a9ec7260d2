import { $api } from '@/lib/api-client';

const NEWEST = 50;

/** The newest posts, among which the one that was just sent is to be found. The live updates keep them fresh. */
export const newestPostsOptions = () =>
  $api.queryOptions('get', '/api/v1/intake', { params: { query: { kind: 'all', limit: NEWEST } } });
