import { $api } from '@/lib/api-client';

export const useChangePassword = () => $api.useMutation('post', '/api/v1/session/password');
