import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aSession } from '@/testing/builders';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';

async function fillIn(user: ReturnType<typeof renderRoute>['user'], wanted: string, again = wanted) {
  await user.type(await screen.findByLabelText('Current password'), 'three blue resistors');
  await user.type(screen.getByLabelText('New password'), wanted);
  await user.type(screen.getByLabelText('New password again'), again);
  await user.click(screen.getByRole('button', { name: 'Change password' }));
}

describe('Settings', () => {
  it('offers each role the sides that are open to it', async () => {
    renderRoute('/settings', [answer('GET', '/session', aSession({ role: 'viewer' }))]);
    const nav = await screen.findByRole('navigation', { name: 'Settings' });
    expect([...nav.querySelectorAll('a')].map((link) => link.textContent)).toEqual([
      'Your account',
      'Rights',
    ]);
  });

  it('changes the own password', async () => {
    const asked: unknown[] = [];
    const { user } = renderRoute('/settings', [
      answer(
        'POST',
        '/session/password',
        async (request: Request) => {
          asked.push(await request.json());
          return null;
        },
        204,
      ),
    ]);
    await fillIn(user, 'seven amber cascodes');
    expect(await screen.findByText(/Your password is changed/)).toBeInTheDocument();
    expect(asked).toEqual([{ currentPassword: 'three blue resistors', newPassword: 'seven amber cascodes' }]);
    expect(screen.getByLabelText('Current password')).toHaveValue('');
  });

  it('sends nothing when the new password was mistyped', async () => {
    const { user } = renderRoute('/settings');
    await fillIn(user, 'seven amber cascodes', 'seven amber cascade');
    expect(await screen.findByText('This is not what stands above.')).toBeVisible();
  });

  it('shows a refusal at its field', async () => {
    const { user } = renderRoute('/settings', [
      refuse('POST', '/session/password', {
        status: 422,
        errors: [
          {
            pointer: '/currentPassword',
            code: 'wrong_password',
            detail: 'This is not your current password.',
          },
        ],
      }),
    ]);
    await fillIn(user, 'seven amber cascodes');
    expect(await screen.findByText('This is not your current password.')).toBeVisible();
    expect(screen.getByLabelText('Current password')).toHaveAttribute('aria-invalid', 'true');
  });
});
