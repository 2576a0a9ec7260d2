import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { mailboxOptions } from '@/features/mailbox/api/get-mailbox';
import { MailboxPage } from '@/features/mailbox/components/mailbox-page';
import { useSite } from '@/lib/site';

export function MailboxRoute() {
  const { localMailbox } = useSite();
  return (
    <>
      <PageHeader
        title="Mailbox"
        lead={
          localMailbox &&
          'Mails are delivered to this page instead of to people, so that nobody outside is written to.'
        }
      />
      {localMailbox ? (
        <Inbox />
      ) : (
        <EmptyState title="There is no local mailbox here.">
          This installation sends its mails to a mail server; they are in people’s own inboxes.
        </EmptyState>
      )}
    </>
  );
}

function Inbox() {
  const [search] = useSearchParams();
  const person = search.get('to') ?? '';
  const { data, error, refetch } = useQuery(mailboxOptions(person));
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Loading label="the mails" />;
  return <MailboxPage mailbox={data} person={person} openId={search.get('mail') ?? ''} />;
}
