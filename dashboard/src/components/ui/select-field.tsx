import { useId } from 'react';
import { FieldFrame } from './field-frame';

export interface SelectOption<Value extends string> {
  value: Value;
  label: string;
}

export interface SelectFieldProps<Value extends string> {
  label: string;
  value: Value;
  options: SelectOption<Value>[];
  onChange: (value: Value) => void;
  hint?: string;
  isDisabled?: boolean;
}

/** A native select in our look: the component library's own points at options that are not there while it is closed. */
export function SelectField<Value extends string>(props: SelectFieldProps<Value>) {
  const { label, value, options, onChange, hint, isDisabled } = props;
  const id = useId();
  return (
    <FieldFrame id={id} label={label} hint={hint}>
      <select
        id={id}
        className="field-control"
        value={value}
        onChange={(event) => onChange(event.target.value as Value)}
        disabled={isDisabled}
        aria-describedby={hint ? `${id}-note` : undefined}
      >
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}
