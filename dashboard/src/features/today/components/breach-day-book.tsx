import { Link } from 'react-router-dom';
import { SlopeMark } from '@/components/ui/slope-mark';
import { TimeText } from '@/components/ui/time-text';
import { paths } from '@/config/paths';
import type { Breach } from '@/types/api';
import styles from './breach-day-book.module.css';

/** Open breaches, one ruled line a cause. */
export function BreachDayBook({ breaches }: { breaches: Breach[] }) {
  if (breaches.length === 0) return <p className={styles.none}>No breach is open.</p>;
  return (
    <ul>
      {breaches.map((breach) => (
        <li key={breach.breachId} className={styles.line}>
          <TimeText at={breach.lastEventAt} show="relative" />
          <span className={styles.mark}>
            {breach.latest && <SlopeMark slope={breach.latest.slope} size={36} />}
          </span>
          <span>
            <Link to={paths.breach(breach.breachId)}>{breach.title}</Link>
            <span className={styles.state}>
              {breach.eventCount} {breach.eventCount === 1 ? 'event' : 'events'},{' '}
              {breach.state === 'acknowledged'
                ? `acknowledged by ${breach.acknowledgedBy ?? 'somebody'}`
                : 'nobody has it yet'}
            </span>
          </span>
        </li>
      ))}
    </ul>
  );
}
