import { Button } from '@/components/ui/button';
import type { ProblemError } from '@/types/api';
import { placeId } from '../place-id';
import styles from './reason-list.module.css';

export interface ReasonListProps {
  errors: ProblemError[];
  /** Reasons that have a place in the body shown below. */
  placed: ReadonlySet<number>;
}

/** Why a post was refused, place by place, each with the way to its place. */
export function ReasonList({ errors, placed }: ReasonListProps) {
  return (
    <ol className={styles.reasons}>
      {errors.map(({ pointer, code, detail }, reason) => (
        <li key={`${pointer} ${code} ${reason}`} className={styles.reason}>
          <code className={styles.pointer}>{pointer || 'the whole post'}</code>
          <span>{detail}</span>
          {placed.has(reason) && (
            <Button kind="quiet" size="small" onClick={() => goTo(reason)}>
              Go to place {reason + 1}
            </Button>
          )}
        </li>
      ))}
    </ol>
  );
}

function goTo(reason: number): void {
  const mark = document.getElementById(placeId(reason));
  mark?.scrollIntoView({ block: 'center' });
  mark?.focus({ preventScroll: true });
}
