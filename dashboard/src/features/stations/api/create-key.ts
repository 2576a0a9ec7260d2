import { useQueryClient } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import { keysOptions } from './get-keys';

export function useCreateKey(station: string) {
  const client = useQueryClient();
  return $api.useMutation('post', '/api/v1/stations/{station}/keys', {
    onSuccess: () => client.invalidateQueries({ queryKey: keysOptions(station).queryKey }),
  });
}
