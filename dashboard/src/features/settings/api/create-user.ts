import { useQueryClient } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import { usersOptions } from './get-users';

export function useCreateUser() {
  const client = useQueryClient();
  return $api.useMutation('post', '/api/v1/users', {
    onSuccess: () => client.invalidateQueries({ queryKey: usersOptions().queryKey }),
  });
}
