import { Link } from 'react-router-dom';
import { SlopeMark } from '@/components/ui/slope-mark';
import { TimeText } from '@/components/ui/time-text';
import { paths } from '@/config/paths';
import type { Breach } from '@/types/api';
import styles from './breach-day-book.module.css';

const MOST_LINES = 6;

/** Open breaches in the order they were opened, newest first, one ruled line a cause. */
export function BreachDayBook({ breaches }: { breaches: Breach[] }) {
  if (breaches.length === 0) return <p className={styles.none}>No breach is open.</p>;
  const newestFirst = [...breaches].sort((a, b) => b.openedAt.localeCompare(a.openedAt));
  return (
    <>
      <ul>
        {newestFirst.slice(0, MOST_LINES).map((breach) => (
          <BreachLine key={breach.breachId} breach={breach} />
        ))}
      </ul>
      {breaches.length > MOST_LINES && (
        <p className={styles.more}>
          <Link to={paths.breaches()}>All {breaches.length} open breaches</Link>
        </p>
      )}
    </>
  );
}

function BreachLine({ breach }: { breach: Breach }) {
  const { eventCount, latest, state, acknowledgedBy } = breach;
  return (
    <li className={styles.line}>
      <span className={styles.mark}>{latest && <SlopeMark slope={latest.slope} size={36} />}</span>
      <span>
        <Link to={paths.breach(breach.breachId)}>{breach.title}</Link>
        <span className={styles.state}>
          <TimeText at={breach.openedAt} show="relative" />, {eventCount}{' '}
          {eventCount === 1 ? 'event' : 'events'},{' '}
          {state === 'acknowledged' ? `${acknowledgedBy ?? 'somebody'} has it` : 'not acknowledged'}
        </span>
      </span>
    </li>
  );
}
