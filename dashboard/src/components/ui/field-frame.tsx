import type { ReactNode } from 'react';
import styles from './field-frame.module.css';

export interface FieldFrameProps {
  id: string;
  label: string;
  hint?: string | undefined;
  error?: string | null | undefined;
  children: ReactNode;
}

/** Label above, note or fault below a control. The control points to the note by `${id}-note`. */
export function FieldFrame({ id, label, hint, error, children }: FieldFrameProps) {
  return (
    <div className={styles.frame}>
      <label htmlFor={id} className={styles.label}>
        {label}
      </label>
      {children}
      {(error || hint) && (
        <p id={`${id}-note`} className={error ? styles.error : styles.hint}>
          {error || hint}
        </p>
      )}
    </div>
  );
}
