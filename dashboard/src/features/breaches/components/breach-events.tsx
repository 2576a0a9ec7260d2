import { Link } from 'react-router-dom';
import { SlopeMark } from '@/components/ui/slope-mark';
import { TimeText } from '@/components/ui/time-text';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { paths } from '@/config/paths';
import type { BreachEvent } from '@/types/api';
import styles from './breach-events.module.css';

/** The results that broke the limit, each with its slope, its judging and the way to its curve. */
export function BreachEvents({ events }: { events: BreachEvent[] }) {
  return (
    <ul>
      {events.map(({ at, text, run }) => (
        <li key={run.resultId} className={styles.event}>
          <SlopeMark slope={run.slope} size={56} />
          <div>
            <p className={styles.head}>
              <Link className="figures" to={paths.unit(run.partNumber, run.serialNumber, run.resultId)}>
                {run.serialNumber}
              </Link>
              <VerdictMark verdict={run.verdict} />
              <span>
                {run.station}
                {run.lot && `, lot ${run.lot}`}
              </span>
              <TimeText at={at} show="both" />
            </p>
            <p>{text}</p>
          </div>
        </li>
      ))}
    </ul>
  );
}
