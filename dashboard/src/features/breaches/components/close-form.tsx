import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { TextAreaField } from '@/components/ui/text-area-field';
import { errorText } from '@/lib/api-error';
import { useToast } from '@/lib/toasts';
import { useCloseBreach } from '../api/close-breach';
import styles from './decision-form.module.css';

export interface CloseFormProps {
  breachId: number;
  /** Closing is the next step; else it is one of two. */
  isPrimary: boolean;
}

export function CloseForm({ breachId, isPrimary }: CloseFormProps) {
  const [cause, setCause] = useState('');
  const [action, setAction] = useState('');
  const close = useCloseBreach();
  const toast = useToast();

  const submit = (event: FormEvent) => {
    event.preventDefault();
    close.mutate(
      { params: { path: { breachId } }, body: { cause: cause.trim(), action: action.trim() } },
      { onSuccess: () => toast({ kind: 'success', text: 'Closed.' }) },
    );
  };

  return (
    <form className={styles.form} onSubmit={submit}>
      <TextAreaField
        label="Cause"
        value={cause}
        onChange={setCause}
        rows={2}
        hint="Why it happened."
        isRequired
      />
      <TextAreaField
        label="Action"
        value={action}
        onChange={setAction}
        rows={2}
        hint="What was done so that it does not return."
        isRequired
      />
      <p className={styles.consequence}>
        A closed breach stays closed. The next unit that breaks the limit opens a new one and sends a new
        mail.
      </p>
      {close.isError && (
        <p role="alert" className={styles.refusal}>
          {errorText(close.error)}
        </p>
      )}
      <div>
        <Button kind={isPrimary ? 'primary' : 'plain'} type="submit" isBusy={close.isPending}>
          Close the breach
        </Button>
      </div>
    </form>
  );
}
