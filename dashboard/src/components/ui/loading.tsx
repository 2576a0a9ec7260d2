import styles from './states.module.css';

export interface LoadingProps {
  /** What is being loaded, for those who listen. */
  label: string;
  lines?: number;
}

/** Ruled lines where the content will stand, so that nothing jumps when it comes. */
export function Loading({ label, lines = 6 }: LoadingProps) {
  return (
    <div className={styles.loading} role="status">
      <span className="visually-hidden">Loading {label}</span>
      {Array.from({ length: lines }, (_, line) => (
        <span key={line} className={styles.line} />
      ))}
    </div>
  );
}
