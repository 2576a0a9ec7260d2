import { keepPreviousData } from '@tanstack/react-query';
import { $api } from '@/lib/api-client';

/** Everybody's mails, or one person's. */
export const mailboxOptions = (to: string) =>
  $api.queryOptions(
    'get',
    '/api/v1/mailbox',
    { params: { query: to === '' ? {} : { to } } },
    { placeholderData: keepPreviousData },
  );
