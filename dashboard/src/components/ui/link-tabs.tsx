import { Link } from 'react-router-dom';
import styles from './link-tabs.module.css';

export interface LinkTab {
  label: string;
  to: string;
  isCurrent: boolean;
}

/** Sides of one page as links in a row; the open one is underlined. Each has its address. */
export function LinkTabs({ label, tabs }: { label: string; tabs: LinkTab[] }) {
  return (
    <nav aria-label={label} className="no-print">
      <ul className={styles.tabs}>
        {tabs.map((tab) => (
          <li key={tab.to}>
            <Link to={tab.to} className={styles.tab} aria-current={tab.isCurrent ? 'page' : undefined}>
              {tab.label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
