import { useState, type ReactNode } from 'react';
import { Link, NavLink, useLocation } from 'react-router-dom';
import { navigation } from '@/config/navigation';
import { paths } from '@/config/paths';
import { useSite } from '@/lib/site';
import styles from './navigation.module.css';
import { Wordmark } from './wordmark';

/** Grouped places; on narrow screens behind a button. `children` stand at its foot. */
export function Navigation({ children }: { children: ReactNode }) {
  const site = useSite();
  const { pathname } = useLocation();
  // Open only on the page where it was opened: going somewhere closes it.
  const [openAt, setOpenAt] = useState<string | null>(null);
  const isOpen = openAt === pathname;
  return (
    <header className={`${styles.column} no-print`}>
      <div className={styles.head}>
        <Link to={paths.today()} className={styles.home} aria-label="Ampkeep, today">
          <Wordmark />
        </Link>
        <p className={styles.site}>{site.name}</p>
        <button
          type="button"
          className={styles.menu}
          aria-expanded={isOpen}
          aria-controls="places"
          onClick={() => setOpenAt(isOpen ? null : pathname)}
        >
          {isOpen ? 'Close' : 'Menu'}
        </button>
      </div>
      <div id="places" className={`${styles.places} ${isOpen ? styles.open : ''}`}>
        <Places />
        <div className={styles.foot}>{children}</div>
      </div>
    </header>
  );
}

function Places() {
  const site = useSite();
  const groups = navigation
    .map((group) => ({
      ...group,
      entries: group.entries.filter(({ shownWhen }) => shownWhen?.(site) ?? true),
    }))
    .filter((group) => group.entries.length > 0);
  return (
    <nav aria-label="Places">
      {groups.map((group) => (
        <div key={group.label} className={styles.group}>
          <p className={styles.groupName} id={`group-${group.label}`}>
            {group.label}
          </p>
          <ul className={styles.entries} aria-labelledby={`group-${group.label}`}>
            {group.entries.map((entry) => (
              <li key={entry.to}>
                <NavLink to={entry.to} end={entry.to === paths.today()} className={styles.entry}>
                  {entry.label}
                </NavLink>
              </li>
            ))}
          </ul>
        </div>
      ))}
    </nav>
  );
}
