import { useId } from 'react';
import { FieldFrame } from './field-frame';

export interface TextAreaFieldProps {
  label: string;
  value: string;
  onChange: (value: string) => void;
  hint?: string;
  error?: string | null;
  rows?: number;
  isRequired?: boolean;
  isDisabled?: boolean;
}

export function TextAreaField({
  label,
  hint,
  error,
  onChange,
  rows = 4,
  isRequired,
  isDisabled,
  value,
}: TextAreaFieldProps) {
  const id = useId();
  return (
    <FieldFrame id={id} label={label} hint={hint} error={error}>
      <textarea
        id={id}
        className="field-control"
        rows={rows}
        value={value}
        onChange={(event) => onChange(event.target.value)}
        required={isRequired}
        disabled={isDisabled}
        aria-invalid={Boolean(error)}
        aria-describedby={error || hint ? `${id}-note` : undefined}
      />
    </FieldFrame>
  );
}
