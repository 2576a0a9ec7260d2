import { useQuery } from '@tanstack/react-query';
import { Disclosure } from '@/components/ui/disclosure';
import { ErrorState } from '@/components/ui/error-state';
import { Facts } from '@/components/ui/facts';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { TimeText } from '@/components/ui/time-text';
import type { MailboxMail } from '@/types/api';
import { mailOptions } from '../api/get-mail';
import { mailDocument } from '../mail-document';
import { MailText } from './mail-text';
import styles from './mail-view.module.css';

/** One mail as its reader gets it. */
export function MailView({ mailId }: { mailId: string }) {
  const { data, error, refetch } = useQuery(mailOptions(mailId));
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Loading label="the mail" lines={10} />;
  return <Mail mail={data} />;
}

function Mail({ mail }: { mail: MailboxMail }) {
  return (
    <Section title={mail.subject}>
      <Facts
        facts={[
          ['From', mail.from],
          ['To', mail.to.join(', ')],
          ['Received', <TimeText at={mail.receivedAt} show="full" />],
        ]}
      />
      {mail.html === null ? (
        <MailText text={mail.text} />
      ) : (
        <>
          {/* No scripts, no origin: what a mail brings along can't reach the dashboard. */}
          <iframe
            className={styles.frame}
            title={`The mail “${mail.subject}”`}
            srcDoc={mailDocument(mail.html)}
            sandbox="allow-popups allow-popups-to-escape-sandbox allow-top-navigation-by-user-activation"
          />
          <Disclosure summary="The same as plain text">
            <MailText text={mail.text} />
          </Disclosure>
        </>
      )}
    </Section>
  );
}
