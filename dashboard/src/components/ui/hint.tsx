import Tooltip from '@douyinfe/semi-ui/lib/es/tooltip';
import type { ReactNode } from 'react';
import styles from './hint.module.css';

/** A dotted word with its explanation, by pointer and by keyboard. */
export function Hint({ text, children }: { text: string; children: ReactNode }) {
  return (
    <Tooltip content={text} position="top">
      <span className={styles.word} tabIndex={0}>
        {children}
      </span>
    </Tooltip>
  );
}
