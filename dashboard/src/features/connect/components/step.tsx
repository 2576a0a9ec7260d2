import type { ReactNode } from 'react';
import styles from './step.module.css';

/** One step of the worked first post. The list around it counts. */
export function Step({ title, children }: { title: string; children: ReactNode }) {
  return (
    <li className={styles.step}>
      <h2 className={styles.title}>{title}</h2>
      <div className={styles.content}>{children}</div>
    </li>
  );
}
