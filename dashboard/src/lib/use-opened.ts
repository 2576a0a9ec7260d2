import { useEffect, useState } from 'react';

/**
 * False when a dialog is first drawn, true from the next frame on. The component library moves the focus into a
 * dialog only when it opens, not when it is there from the beginning.
 */
export function useOpened(): boolean {
  const [isOpened, setOpened] = useState(false);
  useEffect(() => {
    const frame = requestAnimationFrame(() => setOpened(true));
    return () => cancelAnimationFrame(frame);
  }, []);
  return isOpened;
}
