import { useQueryClient } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';
import { stationsOptions } from '@/lib/get-stations';

export function useCreateStation() {
  const client = useQueryClient();
  return $api.useMutation('post', '/api/v1/stations', {
    onSuccess: () => client.invalidateQueries({ queryKey: stationsOptions().queryKey }),
  });
}
