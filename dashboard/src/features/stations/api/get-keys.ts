import { $api } from '@/lib/api-client';

export const keysOptions = (station: string) =>
  $api.queryOptions('get', '/api/v1/stations/{station}/keys', { params: { path: { station } } });
