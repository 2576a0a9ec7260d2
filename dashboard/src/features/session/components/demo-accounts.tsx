import { roleNames } from '@/lib/session';
import { useSite } from '@/lib/site';
import type { DemoAccount } from '@/types/api';
import styles from './demo-accounts.module.css';

export interface DemoAccountsProps {
  onChoose: (account: DemoAccount) => void;
  isBusy: boolean;
}

/** The demonstration's accounts, to sign in with one press. Other sites have none. */
export function DemoAccounts({ onChoose, isBusy }: DemoAccountsProps) {
  const { demoAccounts } = useSite();
  if (demoAccounts.length === 0) return null;
  return (
    <section className={styles.accounts} aria-labelledby="demo-accounts">
      <h2 id="demo-accounts" className={styles.title}>
        This is a demonstration. Sign in as
      </h2>
      <ul className={styles.list}>
        {demoAccounts.map((account) => (
          <li key={account.email}>
            <button
              type="button"
              className={styles.account}
              onClick={() => onChoose(account)}
              disabled={isBusy}
            >
              <span className={styles.role}>{roleNames[account.role]}</span>
              <span className={styles.name}>{account.displayName}</span>
              <span className={styles.secret}>
                <code>{account.email}</code> <code>{account.password}</code>
              </span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
