import { $api } from '@/lib/api-client';

export const todayOptions = () => $api.queryOptions('get', '/api/v1/today');
