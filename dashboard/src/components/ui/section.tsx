import { useId, type ReactNode } from 'react';
import styles from './section.module.css';

export interface SectionProps {
  title: string;
  /** A sentence that says what the figure or table below shows. */
  note?: ReactNode;
  actions?: ReactNode;
  children: ReactNode;
}

/** A part of a page under a strong rule. */
export function Section({ title, note, actions, children }: SectionProps) {
  const headingId = useId();
  return (
    <section className={styles.section} aria-labelledby={headingId}>
      <div className={styles.head}>
        <h2 id={headingId} className={styles.title}>
          {title}
        </h2>
        {note && <p className={styles.note}>{note}</p>}
        {actions && <div className={`${styles.actions} no-print`}>{actions}</div>}
      </div>
      {children}
    </section>
  );
}
