import { useEffect, useRef } from 'react';

/** A scanner types a key every few milliseconds; nobody keeps to less than this on average. */
const AVERAGE_GAP_MS = 50;
/** One key may come late, on a busy machine; a longer pause starts a new run. */
const LONGEST_GAP_MS = 200;
const SHORTEST_CODE = 5;

function isEditable(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement &&
    (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName))
  );
}

/**
 * Calls back with what a barcode scanner typed: a fast run of keys that ends in Enter, anywhere on the page but in
 * a field, where the text belongs to the field.
 */
export function useBarcodeScan(onScan: (code: string) => void): void {
  const latest = useRef(onScan);
  useEffect(() => {
    latest.current = onScan;
  }, [onScan]);

  useEffect(() => {
    let code = '';
    let firstKeyAt = 0;
    let lastKeyAt = 0;

    const onKeyDown = (event: KeyboardEvent) => {
      if (isEditable(event.target) || event.ctrlKey || event.metaKey || event.altKey) return;
      const isSameRun = event.timeStamp - lastKeyAt <= LONGEST_GAP_MS;
      lastKeyAt = event.timeStamp;
      if (event.key === 'Enter') {
        const averageGap = (event.timeStamp - firstKeyAt) / code.length;
        if (isSameRun && code.length >= SHORTEST_CODE && averageGap <= AVERAGE_GAP_MS) {
          // Else Enter would also press the button or link that has the focus.
          event.preventDefault();
          event.stopPropagation();
          latest.current(code);
        }
        code = '';
      } else if (event.key.length === 1) {
        if (!isSameRun || code === '') firstKeyAt = event.timeStamp;
        code = isSameRun ? code + event.key : event.key;
      }
    };

    document.addEventListener('keydown', onKeyDown, { capture: true });
    return () => document.removeEventListener('keydown', onKeyDown, { capture: true });
  }, []);
}
