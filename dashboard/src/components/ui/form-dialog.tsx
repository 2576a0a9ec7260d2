import { useRef, type FormEvent, type ReactNode } from 'react';
import { errorText } from '@/lib/api-error';
import { isAllAtFields } from '@/lib/field-fault';
import { useOpened } from '@/lib/use-opened';
import { Dialog } from './dialog';
import styles from './form-dialog.module.css';

export interface FormDialogProps {
  title: string;
  actionLabel: string;
  onClose: () => void;
  onSubmit: () => void;
  isBusy: boolean;
  /** Why the last try failed. */
  error: unknown;
  /** JSON Pointers of the fields that show their own faults. */
  fields: readonly string[];
  isDanger?: boolean;
  children: ReactNode;
}

/** A dialog around a form: Enter submits, the browser checks what is required, a refusal is said above the buttons. */
export function FormDialog(props: FormDialogProps) {
  const { title, actionLabel, onClose, onSubmit, isBusy, error, fields, isDanger = false, children } = props;
  const isOpen = useOpened();
  const form = useRef<HTMLFormElement>(null);

  const submit = (event: FormEvent) => {
    event.preventDefault();
    // A dialog is drawn elsewhere, but its events also reach the forms it was opened from.
    event.stopPropagation();
    if (!isBusy) onSubmit();
  };

  return (
    <Dialog
      title={title}
      isOpen={isOpen}
      onClose={onClose}
      action={{ label: actionLabel, onAct: () => form.current?.requestSubmit(), isBusy, isDanger }}
    >
      <form ref={form} className={styles.form} onSubmit={submit}>
        {children}
        {Boolean(error) && !isAllAtFields(error, fields) && (
          <p role="alert" className={styles.refusal}>
            {errorText(error)}
          </p>
        )}
        {/* Enter submits only where a form has a submit button; the one people see stands in the dialog's foot. */}
        <button type="submit" hidden tabIndex={-1} />
      </form>
    </Dialog>
  );
}
