import { Link } from 'react-router-dom';
import { CopyButton } from '@/components/ui/copy-button';
import { Dialog } from '@/components/ui/dialog';
import { paths } from '@/config/paths';
import { useOpened } from '@/lib/use-opened';
import type { CreatedApiKey } from '@/types/api';
import styles from './new-key.module.css';

export interface NewKeyProps {
  station: string;
  created: CreatedApiKey;
  onClose: () => void;
}

/** The one time a key can be seen. It lives in this dialog only: nothing keeps it. */
export function NewKey({ station, created, onClose }: NewKeyProps) {
  const isOpen = useOpened();
  return (
    <Dialog title={`New key for ${station}`} isOpen={isOpen} onClose={onClose} closeLabel="I have stored it">
      <p className={styles.warning}>
        Copy this key now. It is shown only this once: Ampkeep keeps no copy, and a lost key has to be
        replaced.
      </p>
      <div className={styles.key}>
        <code className={styles.secret}>{created.key}</code>
        <CopyButton kind="primary" label="Copy key" text={created.key} />
      </div>
      <p className={styles.next}>
        Put it where only the station’s program can read it. Then make the{' '}
        <Link to={paths.connect()}>first post</Link> with it.
      </p>
    </Dialog>
  );
}
