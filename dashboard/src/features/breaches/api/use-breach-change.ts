import { useQueryClient, type Query } from '@tanstack/react-query';
import type { BreachDetail } from '@/types/api';
import { breachOptions } from './get-breach';

const showsBreaches = ({ queryKey }: Query): boolean =>
  queryKey[1] === '/api/v1/breaches' || queryKey[1] === '/api/v1/today';

/** Puts a changed breach where it is shown: its page at once, lists by asking again. */
export function useBreachChange() {
  const client = useQueryClient();
  return {
    onSuccess: (breach: BreachDetail) => {
      client.setQueryData(breachOptions(breach.breachId).queryKey, breach);
      return client.invalidateQueries({ predicate: showsBreaches });
    },
  };
}
