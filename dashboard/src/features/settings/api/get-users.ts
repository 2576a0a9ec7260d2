import { $api } from '@/lib/api-client';

export const usersOptions = () => $api.queryOptions('get', '/api/v1/users');
