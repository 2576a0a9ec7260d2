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
        <svg className={styles.lines} viewBox="0 0 600 400" preserveAspectRatio="xMinYMid slice">
          <path className={styles.level} d="M60 130 H620" />
          <path className={styles.limit} d="M60 130 L620 334" />
          <path className={styles.unit} d="M60 130 L620 214" />
          <circle cx="60" cy="130" r="7" />
          <text x="330" y="120">
            ideal source
          </text>
          <text x="330" y="160" transform="rotate(8.5 330 160)">
            unit
          </text>
          <text x="330" y="222" transform="rotate(20 330 222)">
            limit
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
