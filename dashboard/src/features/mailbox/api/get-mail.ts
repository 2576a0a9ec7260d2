import { $api } from '@/lib/api-client';

/** A mail never changes once it has arrived. */
export const mailOptions = (mailId: string) =>
  $api.queryOptions(
    'get',
    '/api/v1/mailbox/{mailId}',
    { params: { path: { mailId } } },
    { staleTime: Infinity },
  );
