import type { ReactNode } from 'react';
import styles from './states.module.css';

export interface EmptyStateProps {
  /** What is not there, as a sentence. */
  title: string;
  /** Why, and what would bring something here. */
  children?: ReactNode;
}

export function EmptyState({ title, children }: EmptyStateProps) {
  return (
    <div className={styles.empty}>
      <p className={styles.title}>{title}</p>
      {children && <div className={styles.words}>{children}</div>}
    </div>
  );
}
