import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aSession, aSite, aToday } from '@/testing/builders';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';

const nobody = refuse('GET', '/session', { status: 401, code: 'notSignedIn', detail: 'Sign in first.' });

describe('the sign-in', () => {
  it('leads back to the page that asked for it', async () => {
    const { user, router } = renderRoute('/?wanted=yes', [
      nobody,
      answer('POST', '/session', aSession()),
      answer('GET', '/today', aToday()),
    ]);
    await user.type(await screen.findByLabelText('Email'), 'lead@fernhollow.example');
    await user.type(screen.getByLabelText('Password'), 'secret words');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByRole('heading', { name: 'Today' })).toBeInTheDocument();
    expect(router.state.location.search).toBe('?wanted=yes');
  });

  it('never leads to another site', async () => {
    const { router } = renderRoute('/sign-in?from=//evil.example', [answer('GET', '/today', aToday())]);
    await screen.findByRole('heading', { name: 'Today' });
    expect(router.state.location.pathname).toBe('/');
  });

  it('says what to check after a refusal', async () => {
    const { user } = renderRoute('/sign-in', [
      nobody,
      refuse('POST', '/session', { status: 401, code: 'wrongPassword' }),
    ]);
    await user.type(await screen.findByLabelText('Email'), 'lead@fernhollow.example');
    await user.type(screen.getByLabelText('Password'), 'wrong');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(/check both/i);
  });

  it('says when there were too many tries', async () => {
    const { user } = renderRoute('/sign-in', [
      nobody,
      refuse('POST', '/session', { status: 429, code: 'throttled' }),
    ]);
    await user.type(await screen.findByLabelText('Email'), 'lead@fernhollow.example');
    await user.type(screen.getByLabelText('Password'), 'again');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(/wait a minute/i);
  });

  it('offers the accounts of a demonstration and signs in with one press', async () => {
    const account = {
      email: 'engineer@fernhollow.example',
      password: 'slate',
      displayName: 'Tomas Reyl',
      role: 'productionEngineer' as const,
    };
    let sent: unknown;
    const { user } = renderRoute('/sign-in', [
      answer('GET', '/site', aSite({ demo: true, demoAccounts: [account] })),
      nobody,
      answer('POST', '/session', async (request: Request) => {
        sent = await request.json();
        return aSession();
      }),
      answer('GET', '/today', aToday()),
    ]);
    await user.click(await screen.findByRole('button', { name: /production engineer/i }));
    await screen.findByRole('heading', { name: 'Today' });
    expect(sent).toEqual({ email: account.email, password: account.password });
  });

  it('shows no accounts elsewhere', async () => {
    renderRoute('/sign-in', [nobody]);
    await screen.findByLabelText('Email');
    expect(screen.queryByText(/demonstration/i)).not.toBeInTheDocument();
  });
});
