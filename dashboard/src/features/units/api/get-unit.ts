import { $api } from '@/lib/api-client';

export const unitOptions = (partNumber: string, serialNumber: string) =>
  $api.queryOptions('get', '/api/v1/units/{partNumber}/{serialNumber}', {
    params: { path: { partNumber, serialNumber } },
  });
