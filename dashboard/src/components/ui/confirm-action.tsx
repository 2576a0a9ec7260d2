import { useState, type ReactNode } from 'react';
import { errorText } from '@/lib/api-error';
import { Button } from './button';
import styles from './confirm-action.module.css';
import { Dialog } from './dialog';

export interface ConfirmActionProps {
  /** On the button that asks. */
  label: string;
  /** The question, naming the thing. */
  title: string;
  /** What will happen and whether it can be undone. */
  children: ReactNode;
  /** On the button that does it; the same verb. */
  confirmLabel: string;
  onConfirm: () => Promise<unknown>;
  isDanger?: boolean;
  size?: 'small' | 'default';
}

/** An act that asks first. Stays open and says why when the act fails. */
export function ConfirmAction(props: ConfirmActionProps) {
  const { label, title, children, confirmLabel, onConfirm, isDanger = true, size = 'default' } = props;
  const [isOpen, setOpen] = useState(false);
  const [isBusy, setBusy] = useState(false);
  const [error, setError] = useState<unknown>(null);

  const confirm = async () => {
    setBusy(true);
    setError(null);
    try {
      await onConfirm();
      setOpen(false);
    } catch (thrown) {
      setError(thrown);
    } finally {
      setBusy(false);
    }
  };

  return (
    <>
      <Button kind={isDanger ? 'danger' : 'plain'} size={size} onClick={() => setOpen(true)}>
        {label}
      </Button>
      <Dialog
        title={title}
        isOpen={isOpen}
        onClose={() => setOpen(false)}
        action={{ label: confirmLabel, onAct: () => void confirm(), isDanger, isBusy }}
      >
        {children}
        {error !== null && (
          <p role="alert" className={styles.error}>
            {errorText(error)}
          </p>
        )}
      </Dialog>
    </>
  );
}
