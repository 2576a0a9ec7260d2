import { useEffect, useRef, type ReactNode } from 'react';
import styles from './disclosure.module.css';

export interface DisclosureProps {
  summary: string;
  children: ReactNode;
  /** Opened on paper, where nobody can press it. */
  isPrinted?: boolean;
}

export function Disclosure({ summary, children, isPrinted = false }: DisclosureProps) {
  const details = useRef<HTMLDetailsElement>(null);
  useEffect(() => {
    if (!isPrinted) return undefined;
    let wasOpen = false;
    const open = () => {
      if (!details.current) return;
      wasOpen = details.current.open;
      details.current.open = true;
    };
    const restore = () => {
      if (details.current) details.current.open = wasOpen;
    };
    window.addEventListener('beforeprint', open);
    window.addEventListener('afterprint', restore);
    return () => {
      window.removeEventListener('beforeprint', open);
      window.removeEventListener('afterprint', restore);
    };
  }, [isPrinted]);

  return (
    <details ref={details} className={styles.disclosure}>
      <summary className={styles.summary}>{summary}</summary>
      {children}
    </details>
  );
}
