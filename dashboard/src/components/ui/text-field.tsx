import Input from '@douyinfe/semi-ui/lib/es/input';
import { useId } from 'react';
import { FieldFrame } from './field-frame';

export interface TextFieldProps {
  label: string;
  value: string;
  onChange: (value: string) => void;
  type?: 'text' | 'email' | 'password' | 'search';
  name?: string;
  autoComplete?: string;
  placeholder?: string;
  hint?: string;
  error?: string | null;
  isRequired?: boolean;
  isDisabled?: boolean;
  hasFocus?: boolean;
}

export function TextField({
  label,
  hint,
  error,
  onChange,
  isRequired,
  isDisabled,
  hasFocus,
  ...input
}: TextFieldProps) {
  const id = useId();
  return (
    <FieldFrame id={id} label={label} hint={hint} error={error}>
      <Input
        {...input}
        id={id}
        onChange={onChange}
        required={isRequired ?? false}
        disabled={isDisabled ?? false}
        autoFocus={hasFocus ?? false}
        validateStatus={error ? 'error' : 'default'}
        aria-invalid={Boolean(error)}
        aria-describedby={error || hint ? `${id}-note` : undefined}
      />
    </FieldFrame>
  );
}
