import { $api } from './api-client';

export const productsOptions = () =>
  $api.queryOptions('get', '/api/v1/products', {}, { staleTime: 5 * 60_000 });
