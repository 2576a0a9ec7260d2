import type { ReactNode } from 'react';
import styles from './facts.module.css';

export type Fact = [name: string, value: ReactNode];

/** Named facts, one a line; those without a value are left out. */
export function Facts({ facts }: { facts: Fact[] }) {
  return (
    <dl className={styles.facts}>
      {facts
        .filter(([, value]) => value !== null && value !== undefined && value !== '')
        .map(([name, value]) => (
          <div key={name} className={styles.fact}>
            <dt className={styles.name}>{name}</dt>
            <dd>{value}</dd>
          </div>
        ))}
    </dl>
  );
}
