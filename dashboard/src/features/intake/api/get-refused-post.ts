import { $api } from '@/lib/api-client';

export const refusedPostOptions = (intakeId: string) =>
  $api.queryOptions('get', '/api/v1/intake/refused/{intakeId}', { params: { path: { intakeId } } });
