import { TimeText } from '@/components/ui/time-text';
import type { YieldMarker } from '@/types/api';
import type { ChangeMark } from '../mark-changes';
import styles from './change-list.module.css';

const kinds: Record<YieldMarker['kind'], string> = {
  limitSet: 'new limits in force',
  testPlan: 'new test plan in force',
  program: 'program ran for the first time',
};

/** What the lettered lines in the chart stand for. */
export function ChangeList({ marks }: { marks: ChangeMark[] }) {
  if (marks.length === 0)
    return <p className={styles.none}>No limits, plan or program changed in this period.</p>;
  return (
    <ol className={styles.marks} aria-label="Changes marked in the chart">
      {marks.map(({ letter, changes }) => (
        <li key={letter} className={styles.mark}>
          <span className={styles.letter}>{letter}</span>
          <ul className={styles.changes}>
            {changes.map(({ at, kind, text }) => (
              <li key={`${at} ${kind} ${text}`}>
                <TimeText at={at} show="short" /> {text}
                <span className={styles.kind}>, {kinds[kind]}</span>
              </li>
            ))}
          </ul>
        </li>
      ))}
    </ol>
  );
}
