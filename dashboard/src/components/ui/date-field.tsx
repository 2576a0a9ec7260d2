import { useId } from 'react';
import { FieldFrame } from './field-frame';

export interface DateFieldProps {
  label: string;
  /** Calendar day `YYYY-MM-DD`, or empty. */
  value: string;
  onChange: (day: string) => void;
  /** Earliest day that can be chosen. */
  min?: string;
  hint?: string;
  error?: string | null;
}

/** A native date field in our look: keyboard, formats and month sheet come from the browser. */
export function DateField({ label, value, onChange, min, hint, error }: DateFieldProps) {
  const id = useId();
  return (
    <FieldFrame id={id} label={label} hint={hint} error={error}>
      <input
        id={id}
        type="date"
        className="field-control figures"
        value={value}
        min={min}
        onChange={(event) => onChange(event.target.value)}
        aria-invalid={Boolean(error)}
        aria-describedby={error || hint ? `${id}-note` : undefined}
      />
    </FieldFrame>
  );
}
