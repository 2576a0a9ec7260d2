import { useEffect, type ReactNode } from 'react';
import styles from './page-header.module.css';

export interface PageHeaderProps {
  title: string;
  /** Drawn instead of the plain title (a mark beside it, figures); the title stays the document's title. */
  heading?: ReactNode;
  lead?: ReactNode;
  /** Buttons and links that act on the page. */
  actions?: ReactNode;
}

export function PageHeader({ title, heading, lead, actions }: PageHeaderProps) {
  useEffect(() => {
    document.title = `${title} · Ampkeep`;
  }, [title]);

  return (
    <header className={styles.header}>
      <div>
        <h1 className={styles.title}>{heading ?? title}</h1>
        {lead && <div className={styles.lead}>{lead}</div>}
      </div>
      {actions && <div className={`${styles.actions} no-print`}>{actions}</div>}
    </header>
  );
}
