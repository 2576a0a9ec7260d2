import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aSession, aUser } from '@/testing/builders';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';

const admin = aUser({ userId: 1, displayName: 'Ruben Castell', role: 'administrator' });
const mara = aUser({
  userId: 2,
  displayName: 'Mara Osei',
  email: 'mara@fernhollow.example',
  role: 'integrator',
});
const asAdministrator = answer('GET', '/session', aSession(admin));

describe('the accounts', () => {
  it('are kept from those who may not see them, with the reason', async () => {
    renderRoute('/settings/accounts');
    expect(await screen.findByText('Administrators may see and change the accounts.')).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Add an account' })).toBeNull();
  });

  it('are listed with role and state', async () => {
    renderRoute('/settings/accounts', [
      asAdministrator,
      answer('GET', '/users', [admin, { ...mara, active: false, lastSignInAt: null }]),
    ]);
    const row = await screen.findByRole('row', { name: /Mara Osei/ });
    expect(within(row).getByText('Integrator')).toBeVisible();
    expect(within(row).getByText('disabled')).toBeVisible();
    expect(within(row).getByText('never')).toBeVisible();
  });

  it('are added with a role and a first password', async () => {
    const asked: unknown[] = [];
    const users = [admin];
    const { user } = renderRoute('/settings/accounts', [
      asAdministrator,
      answer('GET', '/users', () => users),
      answer(
        'POST',
        '/users',
        async (request: Request) => {
          asked.push(await request.json());
          users.push(mara);
          return mara;
        },
        201,
      ),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Add an account' }));
    await user.type(await screen.findByLabelText('Name'), 'Mara Osei');
    await user.type(screen.getByLabelText('Email'), 'mara@fernhollow.example');
    await user.selectOptions(screen.getByLabelText('Role'), 'integrator');
    await user.type(screen.getByLabelText('First password'), 'three blue resistors');
    await user.click(screen.getByRole('button', { name: 'Add account' }));
    expect(await screen.findByRole('row', { name: /Mara Osei/ })).toBeVisible();
    expect(asked).toEqual([
      {
        displayName: 'Mara Osei',
        email: 'mara@fernhollow.example',
        role: 'integrator',
        password: 'three blue resistors',
      },
    ]);
  });

  it('send only what was changed', async () => {
    const asked: unknown[] = [];
    const { user } = renderRoute('/settings/accounts', [
      asAdministrator,
      answer('GET', '/users', [admin, mara]),
      answer('PATCH', '/users/2', async (request: Request) => {
        asked.push(await request.json());
        return { ...mara, role: 'qualityLead' };
      }),
    ]);
    const row = await screen.findByRole('row', { name: /Mara Osei/ });
    await user.click(within(row).getByRole('button', { name: 'Change' }));
    await user.selectOptions(await screen.findByLabelText('Role'), 'qualityLead');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(asked).toEqual([{ role: 'qualityLead' }]);
  });

  it('ask before one is disabled, and keep the own one safe', async () => {
    const asked: unknown[] = [];
    const { user } = renderRoute('/settings/accounts', [
      asAdministrator,
      answer('GET', '/users', [admin, mara]),
      answer('PATCH', '/users/2', async (request: Request) => {
        asked.push(await request.json());
        return { ...mara, active: false };
      }),
    ]);
    const own = await screen.findByRole('row', { name: /Ruben Castell/ });
    expect(within(own).queryByRole('button', { name: 'Disable' })).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Disable' }));
    expect(await screen.findByText(/All sessions of the account end at once/)).toBeVisible();
    expect(asked).toEqual([]);
    await user.click(screen.getByRole('button', { name: 'Disable account' }));
    await waitFor(() => expect(asked).toEqual([{ active: false }]));
  });

  it('say why a change was refused', async () => {
    const { user } = renderRoute('/settings/accounts', [
      asAdministrator,
      answer('GET', '/users', [admin]),
      refuse('PATCH', '/users/1', {
        status: 409,
        code: 'last_administrator',
        detail: 'This is the last active administrator.',
      }),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Change' }));
    await user.selectOptions(await screen.findByLabelText('Role'), 'viewer');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    expect(await screen.findByText('This is the last active administrator.')).toBeVisible();
  });
});
