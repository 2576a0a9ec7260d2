import { $api } from '@/lib/api-client';
import { useBreachChange } from './use-breach-change';

export const useAcknowledgeBreach = () =>
  $api.useMutation('post', '/api/v1/breaches/{breachId}/acknowledge', useBreachChange());
