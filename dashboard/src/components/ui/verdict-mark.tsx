import type { ReactNode } from 'react';
import type { Verdict } from '@/types/api';
import { verdictNames } from '@/utils/verdict-names';
import styles from './verdict-mark.module.css';

const shapes: Record<Verdict, ReactNode> = {
  pass: <rect x="2" y="2" width="12" height="12" fill="currentColor" />,
  fail: <path d="M1 2 L15 2 L15 15 Z" fill="currentColor" />,
  notProven: <path d="M12.6 4.2 A6 6 0 1 0 12.6 11.8" fill="none" stroke="currentColor" strokeWidth="2.5" />,
  unjudged: <path d="M3 8 H13" stroke="currentColor" strokeWidth="2.5" />,
  aborted: <path d="M3 3 L13 13 M13 3 L3 13" stroke="currentColor" strokeWidth="2.5" />,
};

export interface VerdictMarkProps {
  verdict: Verdict;
  size?: number;
  /** Only where a column or a sentence already says the word; it stays as the accessible name. */
  isWordHidden?: boolean;
}

/** A verdict by shape, word and colour together. */
export function VerdictMark({ verdict, size = 14, isWordHidden = false }: VerdictMarkProps) {
  return (
    <span className={`${styles.mark} ${styles[verdict]}`}>
      <svg width={size} height={size} viewBox="0 0 16 16" aria-hidden>
        {shapes[verdict]}
      </svg>
      <span className={isWordHidden ? 'visually-hidden' : undefined}>{verdictNames[verdict]}</span>
    </span>
  );
}
