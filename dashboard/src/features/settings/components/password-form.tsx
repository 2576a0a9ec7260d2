import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { errorText, isApiError } from '@/lib/api-error';
import { fieldFault, isAllAtFields } from '@/lib/field-fault';
import { useToast } from '@/lib/toasts';
import { useChangePassword } from '../api/change-password';
import styles from './password-form.module.css';

const nothing = { current: '', wanted: '', again: '' };

function refusal(error: unknown): string {
  if (isApiError(error) && error.status === 429) return 'Too many tries. Wait a minute, then try again.';
  return errorText(error);
}

export function PasswordForm() {
  const [passwords, setPasswords] = useState(nothing);
  const [isMistyped, setMistyped] = useState(false);
  const change = useChangePassword();
  const toast = useToast();
  const set = (part: Partial<typeof nothing>) => setPasswords((before) => ({ ...before, ...part }));

  const submit = (event: FormEvent) => {
    event.preventDefault();
    const differ = passwords.wanted !== passwords.again;
    setMistyped(differ);
    if (differ) return;
    change.mutate(
      { body: { currentPassword: passwords.current, newPassword: passwords.wanted } },
      {
        onSuccess: () => {
          setPasswords(nothing);
          toast({ kind: 'success', text: 'Your password is changed. Your other sessions were ended.' });
        },
      },
    );
  };

  return (
    <form className={styles.form} onSubmit={submit}>
      <TextField
        label="Current password"
        type="password"
        autoComplete="current-password"
        value={passwords.current}
        onChange={(current) => set({ current })}
        error={fieldFault(change.error, '/currentPassword')}
        isRequired
      />
      <TextField
        label="New password"
        type="password"
        autoComplete="new-password"
        value={passwords.wanted}
        onChange={(wanted) => set({ wanted })}
        hint="At least 12 characters. Three words that don’t belong together do well."
        error={fieldFault(change.error, '/newPassword')}
        isRequired
      />
      <TextField
        label="New password again"
        type="password"
        autoComplete="new-password"
        value={passwords.again}
        onChange={(again) => set({ again })}
        error={isMistyped ? 'This is not what stands above.' : null}
        isRequired
      />
      {change.isError && !isAllAtFields(change.error, ['/currentPassword', '/newPassword']) && (
        <p role="alert" className={styles.refusal}>
          {refusal(change.error)}
        </p>
      )}
      <div>
        <Button kind="primary" type="submit" isBusy={change.isPending}>
          Change password
        </Button>
      </div>
    </form>
  );
}
