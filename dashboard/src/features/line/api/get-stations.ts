import { $api } from '@/lib/api-client';

export const stationsOptions = () => $api.queryOptions('get', '/api/v1/stations');
