import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { FormDialog } from '@/components/ui/form-dialog';
import { TextField } from '@/components/ui/text-field';
import { fieldFault } from '@/lib/field-fault';
import { useToast } from '@/lib/toasts';
import type { User } from '@/types/api';
import { useUpdateUser } from '../api/update-user';
import { RoleSelect } from './role-select';

/** Name, role and a new password of an account. What is left as it stands is not sent. */
export function ChangeAccount({ user }: { user: User }) {
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <Button size="small" onClick={() => setOpen(true)}>
        Change
      </Button>
      {isOpen && <ChangeForm user={user} onClose={() => setOpen(false)} />}
    </>
  );
}

function ChangeForm({ user, onClose }: { user: User; onClose: () => void }) {
  const [displayName, setDisplayName] = useState(user.displayName);
  const [role, setRole] = useState(user.role);
  const [password, setPassword] = useState('');
  const update = useUpdateUser();
  const toast = useToast();

  const submit = () =>
    update.mutate(
      {
        params: { path: { userId: user.userId } },
        body: {
          ...(displayName.trim() !== user.displayName && { displayName: displayName.trim() }),
          ...(role !== user.role && { role }),
          ...(password !== '' && { password }),
        },
      },
      {
        onSuccess: (changed) => {
          toast({ kind: 'success', text: `The account of ${changed.displayName} is changed.` });
          onClose();
        },
      },
    );

  return (
    <FormDialog
      title={`Change ${user.email}`}
      actionLabel="Save"
      onClose={onClose}
      onSubmit={submit}
      isBusy={update.isPending}
      error={update.error}
      fields={['/displayName', '/password']}
    >
      <TextField
        label="Name"
        value={displayName}
        onChange={setDisplayName}
        autoComplete="off"
        error={fieldFault(update.error, '/displayName')}
        isRequired
        hasFocus
      />
      <RoleSelect role={role} onChange={setRole} />
      <TextField
        label="New password"
        type="password"
        value={password}
        onChange={setPassword}
        autoComplete="new-password"
        hint="Left empty, the password stays. A new one ends the account’s sessions."
        error={fieldFault(update.error, '/password')}
      />
    </FormDialog>
  );
}
