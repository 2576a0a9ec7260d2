import { $api } from '@/lib/api-client';

/** The table of rights changes only with a new version of the server. */
export const rightsOptions = () => $api.queryOptions('get', '/api/v1/rights', {}, { staleTime: Infinity });
