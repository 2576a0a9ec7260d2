import { useCallback } from 'react';
import { useSearchParams } from 'react-router-dom';

/** Changes filters in the address. An empty value takes its filter away; any change starts again at the newest page. */
export function useSearchChange() {
  const [, setSearch] = useSearchParams();
  return useCallback(
    (changes: Record<string, string>) =>
      setSearch(
        (before) => {
          const next = new URLSearchParams(before);
          next.delete('cursor');
          for (const [key, value] of Object.entries(changes)) {
            if (value === '') next.delete(key);
            else next.set(key, value);
          }
          return next;
        },
        { replace: true },
      ),
    [setSearch],
  );
}
