import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { TextAreaField } from '@/components/ui/text-area-field';
import { errorText } from '@/lib/api-error';
import { useToast } from '@/lib/toasts';
import { useAcknowledgeBreach } from '../api/acknowledge-breach';
import styles from './decision-form.module.css';

export function AcknowledgeForm({ breachId }: { breachId: number }) {
  const [note, setNote] = useState('');
  const acknowledge = useAcknowledgeBreach();
  const toast = useToast();

  const submit = (event: FormEvent) => {
    event.preventDefault();
    acknowledge.mutate(
      { params: { path: { breachId } }, body: { note: note.trim() } },
      { onSuccess: () => toast({ kind: 'success', text: 'Acknowledged. It is yours now.' }) },
    );
  };

  return (
    <form className={styles.form} onSubmit={submit}>
      <TextAreaField
        label="Note"
        value={note}
        onChange={setNote}
        rows={3}
        hint="What you know and what you do next. It says to everybody that somebody has this."
        isRequired
      />
      {acknowledge.isError && (
        <p role="alert" className={styles.refusal}>
          {errorText(acknowledge.error)}
        </p>
      )}
      <div>
        <Button kind="primary" type="submit" isBusy={acknowledge.isPending}>
          Acknowledge
        </Button>
      </div>
    </form>
  );
}
