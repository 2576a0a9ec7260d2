import { useToast } from '@/lib/toasts';
import { errorText } from '@/lib/api-error';
import { roleNames, useUser } from '@/lib/session';
import { useSignOut } from '../api/sign-out';
import styles from './person.module.css';

/** Who is signed in, and the way out. */
export function Person() {
  const user = useUser();
  const signOut = useSignOut();
  const toast = useToast();
  const leave = () =>
    signOut.mutate({}, { onError: (error) => toast({ kind: 'error', text: errorText(error) }) });
  return (
    <div className={styles.person}>
      <p className={styles.name}>{user.displayName}</p>
      <p className={styles.role}>{roleNames[user.role]}</p>
      <button type="button" className={styles.out} onClick={leave} disabled={signOut.isPending}>
        Sign out
      </button>
    </div>
  );
}
