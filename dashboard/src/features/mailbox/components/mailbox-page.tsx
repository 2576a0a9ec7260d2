import { Link } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { SelectField } from '@/components/ui/select-field';
import { paths } from '@/config/paths';
import { useSearchChange } from '@/lib/use-search-change';
import type { MailboxPage as Mailbox } from '@/types/api';
import { MailList } from './mail-list';
import { MailView } from './mail-view';
import styles from './mailbox-page.module.css';

export interface MailboxPageProps {
  mailbox: Mailbox;
  /** Whose mails are shown; empty for everybody's. */
  person: string;
  /** The mail that is open; empty for none. */
  openId: string;
}

/** The inbox beside the open mail; on a phone one after the other. */
export function MailboxPage({ mailbox: { addresses, items }, person, openId }: MailboxPageProps) {
  const change = useSearchChange();
  const people = [...new Set([...addresses, ...(person ? [person] : [])])].sort();
  return (
    <div className={`${styles.columns} ${openId ? styles.reading : ''}`}>
      <div className={styles.inbox}>
        <SelectField
          label="Inbox of"
          value={person}
          options={[{ value: '', label: 'everybody' }, ...people.map((value) => ({ value, label: value }))]}
          onChange={(to) => change({ to, mail: '' })}
        />
        {items.length > 0 ? (
          <MailList mails={items} person={person} openId={openId} />
        ) : (
          <EmptyState title={person ? `No mail for ${person} yet.` : 'No mail was sent yet.'}>
            The first unit that breaks a limit opens a breach, and its mail appears here by itself.
          </EmptyState>
        )}
      </div>
      <div className={styles.mail}>
        {openId ? (
          <>
            <Link className={styles.back} to={paths.mailbox(person ? { to: person } : {})}>
              All mails
            </Link>
            <MailView key={openId} mailId={openId} />
          </>
        ) : (
          items.length > 0 && <p className={styles.none}>Choose a mail to read it.</p>
        )}
      </div>
    </div>
  );
}
