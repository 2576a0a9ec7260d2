import { Link } from 'react-router-dom';
import { TimeText } from '@/components/ui/time-text';
import { paths } from '@/config/paths';
import { useSite } from '@/lib/site';
import type { OutboxMail } from '@/types/api';
import styles from './breach-mails.module.css';

/** Who was told, and whether it got out. */
export function BreachMails({ mails }: { mails: OutboxMail[] }) {
  const { localMailbox } = useSite();
  if (mails.length === 0) {
    return (
      <p className={styles.none}>
        No mail was sent about this breach: its first result was older than a day when it came in, or there
        was no active quality lead to tell.
      </p>
    );
  }
  return (
    <ul>
      {mails.map((mail) => (
        <li key={mail.mailId} className={styles.mail}>
          <p className={styles.subject}>{mail.subject}</p>
          <p>
            to {localMailbox ? <Link to={paths.mailbox({ to: mail.to })}>{mail.to}</Link> : mail.to}
            {' · '}
            <MailState mail={mail} />
          </p>
          {mail.lastError && mail.state !== 'sent' && <p className={styles.error}>{mail.lastError}</p>}
        </li>
      ))}
    </ul>
  );
}

function MailState({ mail }: { mail: OutboxMail }) {
  const tries = mail.attempts === 1 ? '1 try' : `${mail.attempts} tries`;
  if (mail.state === 'sent') {
    return (
      <>
        sent <TimeText at={mail.sentAt} show="both" />
      </>
    );
  }
  if (mail.state === 'waiting') {
    return <>{mail.attempts === 0 ? 'about to be sent' : `waiting for the next try, ${tries} so far`}</>;
  }
  return <strong className={styles.failed}>failed after {tries}</strong>;
}
