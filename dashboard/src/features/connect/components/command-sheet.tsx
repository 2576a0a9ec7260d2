import { CopyButton } from '@/components/ui/copy-button';
import styles from './command-sheet.module.css';

/** A command to copy, drawn on a sheet of its own. */
export function CommandSheet({ command }: { command: string }) {
  return (
    <div className={styles.sheet}>
      <div className={styles.copy}>
        <CopyButton kind="primary" label="Copy command" text={command} />
      </div>
      <pre className={styles.command} role="region" aria-label="The command" tabIndex={0}>
        {command}
      </pre>
    </div>
  );
}
