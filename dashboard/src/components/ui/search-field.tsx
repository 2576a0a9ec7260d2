import { useEffect, useState } from 'react';
import { useSearchChange } from '@/lib/use-search-change';
import { TextField } from './text-field';

const TYPING_PAUSE_MS = 250;

export interface SearchFieldProps {
  label: string;
  /** Name of the filter in the address. */
  name: string;
  value: string;
  placeholder?: string;
}

/** A text filter: the address follows after a pause in typing, the field follows the address. */
export function SearchField({ label, name, value, placeholder = '' }: SearchFieldProps) {
  const change = useSearchChange();
  const [text, setText] = useState(value);
  const [shownValue, setShownValue] = useState(value);
  if (value !== shownValue) {
    setShownValue(value);
    setText(value);
  }

  useEffect(() => {
    if (text.trim() === value) return undefined;
    const timer = setTimeout(() => change({ [name]: text.trim(), open: '' }), TYPING_PAUSE_MS);
    return () => clearTimeout(timer);
  }, [text, value, name, change]);

  return (
    <TextField
      label={label}
      name={name}
      type="search"
      value={text}
      onChange={setText}
      placeholder={placeholder}
      autoComplete="off"
    />
  );
}
