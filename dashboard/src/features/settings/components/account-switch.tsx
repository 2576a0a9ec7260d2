import { ConfirmAction } from '@/components/ui/confirm-action';
import { useUser } from '@/lib/session';
import { useToast } from '@/lib/toasts';
import type { User } from '@/types/api';
import { useUpdateUser } from '../api/update-user';

/** Disables or enables an account. Nothing is ever removed: records name who did what. */
export function AccountSwitch({ user: { userId, displayName, active } }: { user: User }) {
  const update = useUpdateUser();
  const toast = useToast();
  const isOwn = useUser().userId === userId;
  if (isOwn) return null;

  const change = async () => {
    await update.mutateAsync({ params: { path: { userId } }, body: { active: !active } });
    toast({ kind: 'success', text: `${displayName} is ${active ? 'disabled' : 'enabled'}.` });
  };
  return (
    <ConfirmAction
      label={active ? 'Disable' : 'Enable'}
      title={active ? `Disable ${displayName}?` : `Enable ${displayName}?`}
      confirmLabel={active ? 'Disable account' : 'Enable account'}
      onConfirm={change}
      isDanger={active}
      size="small"
    >
      {active
        ? 'All sessions of the account end at once and nobody can sign in with it. It can be enabled again.'
        : 'The account can sign in again with the password it had.'}
    </ConfirmAction>
  );
}
