import styles from './proof-table.module.css';

/** Agreement by shape and word: a square, or a wedge that falls. */
export function ProofMark({ isOk }: { isOk: boolean }) {
  return (
    <span className={isOk ? styles.agrees : styles.short}>
      <svg width="12" height="12" viewBox="0 0 16 16" aria-hidden>
        {isOk ? (
          <rect x="2" y="2" width="12" height="12" fill="currentColor" />
        ) : (
          <path d="M1 2 L15 2 L15 15 Z" fill="currentColor" />
        )}
      </svg>
      {isOk ? 'agrees' : 'falls short'}
    </span>
  );
}
