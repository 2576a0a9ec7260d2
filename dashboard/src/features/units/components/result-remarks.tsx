import type { ResultDetail } from '@/types/api';
import styles from './result-remarks.module.css';

/** What the computation and the intake noticed about a result, in words. */
export function ResultRemarks({ result: { flagTexts, warnings } }: { result: ResultDetail }) {
  if (flagTexts.length + warnings.length === 0) return null;
  return (
    <ul className={styles.remarks} aria-label="Remarks">
      {[...flagTexts, ...warnings].map(({ code, text }) => (
        <li key={code} className={styles.remark}>
          {text}
        </li>
      ))}
    </ul>
  );
}
