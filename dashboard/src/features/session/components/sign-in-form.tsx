import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { errorText, isApiError } from '@/lib/api-error';
import { useSignIn } from '../api/sign-in';
import { DemoAccounts } from './demo-accounts';
import styles from './sign-in-form.module.css';

function refusal(error: unknown): string {
  if (isApiError(error) && error.status === 401)
    return 'No account has this address and password. Check both.';
  if (isApiError(error) && error.status === 429) return 'Too many tries. Wait a minute, then sign in again.';
  return errorText(error);
}

export function SignInForm() {
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const signIn = useSignIn();

  const submit = (event: FormEvent) => {
    event.preventDefault();
    signIn.mutate({ body: { email: email.trim(), password } });
  };

  return (
    <>
      <form className={styles.form} onSubmit={submit}>
        <TextField
          label="Email"
          type="email"
          name="email"
          autoComplete="username"
          value={email}
          onChange={setEmail}
          isRequired
          hasFocus
        />
        <TextField
          label="Password"
          type="password"
          name="password"
          autoComplete="current-password"
          value={password}
          onChange={setPassword}
          isRequired
        />
        {signIn.isError && (
          <p role="alert" className={styles.refusal}>
            {refusal(signIn.error)}
          </p>
        )}
        <div>
          <Button kind="primary" type="submit" isBusy={signIn.isPending}>
            Sign in
          </Button>
        </div>
      </form>
      <DemoAccounts
        isBusy={signIn.isPending}
        onChoose={(account) => signIn.mutate({ body: { email: account.email, password: account.password } })}
      />
    </>
  );
}
