import { $api } from '@/lib/api-client';
import { useBreachChange } from './use-breach-change';

export const useCloseBreach = () =>
  $api.useMutation('post', '/api/v1/breaches/{breachId}/close', useBreachChange());
