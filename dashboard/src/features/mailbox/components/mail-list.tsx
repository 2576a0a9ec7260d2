import { Link } from 'react-router-dom';
import { TimeText } from '@/components/ui/time-text';
import { paths } from '@/config/paths';
import type { MailboxItem } from '@/types/api';
import styles from './mail-list.module.css';

export interface MailListProps {
  mails: MailboxItem[];
  /** The person whose mails these are; empty for everybody's. */
  person: string;
  openId: string;
}

/** Mails, newest first; each has its address. */
export function MailList({ mails, person, openId }: MailListProps) {
  return (
    <ul aria-label="Mails">
      {mails.map(({ mailId, subject, to, receivedAt }) => (
        <li key={mailId}>
          <Link
            className={styles.mail}
            to={paths.mailbox({ ...(person ? { to: person } : {}), mail: mailId })}
            aria-current={mailId === openId ? 'true' : undefined}
          >
            <span className={styles.subject}>{subject}</span>
            <span className={styles.about}>
              {to.join(', ')} · <TimeText at={receivedAt} show="both" />
            </span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
