import { useQueryClient } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import { sessionOptions } from '@/lib/session';
import { usersOptions } from './get-users';

export function useUpdateUser() {
  const client = useQueryClient();
  return $api.useMutation('patch', '/api/v1/users/{userId}', {
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: usersOptions().queryKey });
      // It may have been the own account: its name and role stand in the shell.
      await client.invalidateQueries({ queryKey: sessionOptions().queryKey });
    },
  });
}
