import { useEffect, useRef, type ReactNode } from 'react';
import { useLocation } from 'react-router-dom';
import { ConnectionNotice } from './connection-notice';
import { Navigation } from './navigation';
import styles from './shell.module.css';
import { ThemeSwitch } from './theme-switch';

export interface ShellProps {
  /** The stations, along the top. */
  strip: ReactNode;
  /** Who is signed in, and the way out. */
  person: ReactNode;
  children: ReactNode;
}

/** The frame around every page: navigation at the left, the line along the top, the page on its sheet. */
export function Shell({ strip, person, children }: ShellProps) {
  const main = useRef<HTMLElement>(null);
  useFocusOnNewPage(main);
  return (
    <div className={styles.shell}>
      <a className={styles.skip} href="#page">
        Skip to the page
      </a>
      <Navigation>
        <ThemeSwitch />
        {person}
      </Navigation>
      <section className={`${styles.strip} no-print`} aria-label="The line">
        {strip}
      </section>
      <main className={styles.page} id="page" ref={main} tabIndex={-1}>
        <ConnectionNotice />
        {children}
      </main>
    </div>
  );
}

/** After a change of page the keyboard starts at the new page, not where the old link was. */
function useFocusOnNewPage(main: React.RefObject<HTMLElement | null>): void {
  const { pathname } = useLocation();
  const lastPath = useRef(pathname);
  useEffect(() => {
    if (lastPath.current === pathname) return;
    lastPath.current = pathname;
    main.current?.focus({ preventScroll: true });
  }, [pathname, main]);
}
