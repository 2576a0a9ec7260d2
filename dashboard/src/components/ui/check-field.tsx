import { useId } from 'react';
import styles from './check-field.module.css';

export interface CheckFieldProps {
  label: string;
  isChecked: boolean;
  onChange: (isChecked: boolean) => void;
  hint?: string;
}

/** A native checkbox in our look, its label beside it and a note below. */
export function CheckField({ label, isChecked, onChange, hint }: CheckFieldProps) {
  const id = useId();
  return (
    <div className={styles.frame}>
      <input
        id={id}
        type="checkbox"
        className={styles.box}
        checked={isChecked}
        onChange={(event) => onChange(event.target.checked)}
        aria-describedby={hint ? `${id}-note` : undefined}
      />
      <label htmlFor={id} className={styles.label}>
        {label}
      </label>
      {hint && (
        <p id={`${id}-note`} className={styles.hint}>
          {hint}
        </p>
      )}
    </div>
  );
}
