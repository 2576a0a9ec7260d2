import { useQueryClient } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import { sessionOptions } from '@/lib/session';

export function useSignOut() {
  const client = useQueryClient();
  return $api.useMutation('delete', '/api/v1/session', {
    onSuccess: () => {
      // Nothing of one person may be shown to the next.
      client.removeQueries({ predicate: (query) => query.queryKey[1] !== '/api/v1/site' });
      client.setQueryData(sessionOptions().queryKey, null);
    },
  });
}
