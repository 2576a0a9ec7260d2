import styles from './wordmark.module.css';

/** The name over the level line it measures against. */
export function Wordmark() {
  return (
    <span className={styles.wordmark}>
      <svg width="26" height="20" viewBox="0 0 26 20" aria-hidden>
        <path className={styles.level} d="M2 5 H26" />
        <path className={styles.slope} d="M2 5 L26 14" />
        <circle cx="3" cy="5" r="3" />
      </svg>
      Ampkeep
    </span>
  );
}
