import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { FormDialog } from '@/components/ui/form-dialog';
import { TextField } from '@/components/ui/text-field';
import { fieldFault } from '@/lib/field-fault';
import { useToast } from '@/lib/toasts';
import type { Role } from '@/types/api';
import { useCreateUser } from '../api/create-user';
import { RoleSelect } from './role-select';

export function AddAccount() {
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <Button kind="primary" onClick={() => setOpen(true)}>
        Add an account
      </Button>
      {isOpen && <AccountForm onClose={() => setOpen(false)} />}
    </>
  );
}

function AccountForm({ onClose }: { onClose: () => void }) {
  const [email, setEmail] = useState('');
  const [displayName, setDisplayName] = useState('');
  const [role, setRole] = useState<Role>('viewer');
  const [password, setPassword] = useState('');
  const create = useCreateUser();
  const toast = useToast();

  const submit = () =>
    create.mutate(
      { body: { email: email.trim(), displayName: displayName.trim(), role, password } },
      {
        onSuccess: (user) => {
          toast({ kind: 'success', text: `${user.displayName} can sign in now.` });
          onClose();
        },
      },
    );

  return (
    <FormDialog
      title="Add an account"
      actionLabel="Add account"
      onClose={onClose}
      onSubmit={submit}
      isBusy={create.isPending}
      error={create.error}
      fields={['/email', '/displayName', '/password']}
    >
      <TextField
        label="Name"
        value={displayName}
        onChange={setDisplayName}
        autoComplete="off"
        error={fieldFault(create.error, '/displayName')}
        isRequired
        hasFocus
      />
      <TextField
        label="Email"
        type="email"
        value={email}
        onChange={setEmail}
        autoComplete="off"
        hint="Signs in with it, and quality leads get their mails there."
        error={fieldFault(create.error, '/email')}
        isRequired
      />
      <RoleSelect role={role} onChange={setRole} />
      <TextField
        label="First password"
        type="password"
        value={password}
        onChange={setPassword}
        autoComplete="new-password"
        hint="At least 12 characters; to be changed by its owner under Settings."
        error={fieldFault(create.error, '/password')}
        isRequired
      />
    </FormDialog>
  );
}
