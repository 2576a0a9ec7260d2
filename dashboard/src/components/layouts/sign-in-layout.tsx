import { useEffect, type ReactNode } from 'react';
import { useSite } from '@/lib/site';
import styles from './sign-in-layout.module.css';
import { ThemeSwitch } from './theme-switch';
import { Wordmark } from './wordmark';

/** The sign-in on its sheet, beside what Ampkeep draws all day: a line against the level. */
export function SignInLayout({ children }: { children: ReactNode }) {
  const site = useSite();
  useEffect(() => {
    document.title = 'Sign in · Ampkeep';
  }, []);
  return (
    <div className={styles.layout}>
      <div className={styles.drawing} aria-hidden>
        <svg className={styles.lines} viewBox="0 0 1000 800" preserveAspectRatio="xMinYMid slice">
          <path className={styles.level} d="M80 260 H1400" />
          <path className={styles.limit} d="M80 260 L1400 740" />
          <path className={styles.unit} d="M80 260 L1400 457" />
          <circle cx="80" cy="260" r="8" />
          <text x="440" y="250">
            ideal source
          </text>
          <text x="440" y="304" transform="rotate(8.5 440 304)">
            a unit
          </text>
          <text x="440" y="381" transform="rotate(20 440 381)">
            its limit
          </text>
        </svg>
      </div>
      <main className={styles.sheet}>
        <div className={styles.head}>
          <h1 className={styles.title}>
            <Wordmark />
          </h1>
          <p className={styles.site}>{site.name}</p>
        </div>
        {children}
        <div className={styles.theme}>
          <ThemeSwitch />
        </div>
      </main>
    </div>
  );
}
