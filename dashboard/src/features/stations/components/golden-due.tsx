import { TimeText } from '@/components/ui/time-text';
import { useNow } from '@/lib/now';
import type { Station } from '@/types/api';
import styles from './fact-text.module.css';

/** When the next check with a golden unit is owed. */
export function GoldenDue({ station: { goldenDueAt } }: { station: Station }) {
  const isOverdue = useNow() >= Date.parse(goldenDueAt ?? '');
  if (goldenDueAt === null) return <>none owed</>;
  return (
    <span className={isOverdue ? styles.trouble : undefined}>
      {isOverdue ? 'due since ' : 'due '}
      <TimeText at={goldenDueAt} show={isOverdue ? 'short' : 'relative'} />
    </span>
  );
}
