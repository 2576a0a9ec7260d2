import { useQueryClient } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import { sessionOptions } from '@/lib/session';

export function useSignIn() {
  const client = useQueryClient();
  return $api.useMutation('post', '/api/v1/session', {
    onSuccess: (session) => {
      client.setQueryData(sessionOptions().queryKey, session);
    },
  });
}
