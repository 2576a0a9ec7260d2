import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { ApiError } from '@/lib/api-error';
import { ConfirmAction } from './confirm-action';

function renderRevoke(onConfirm: () => Promise<unknown>) {
  render(
    <ConfirmAction label="Revoke" title="Revoke the key?" confirmLabel="Revoke the key" onConfirm={onConfirm}>
      It stops working at once.
    </ConfirmAction>,
  );
  return userEvent.setup();
}

describe('ConfirmAction', () => {
  it('asks before it acts and can be left', async () => {
    const revoke = vi.fn(() => Promise.resolve());
    const user = renderRevoke(revoke);
    await user.click(screen.getByRole('button', { name: 'Revoke' }));
    expect(screen.getByText('It stops working at once.')).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Cancel' }));
    expect(revoke).not.toHaveBeenCalled();
  });

  it('acts once confirmed', async () => {
    const revoke = vi.fn(() => Promise.resolve());
    const user = renderRevoke(revoke);
    await user.click(screen.getByRole('button', { name: 'Revoke' }));
    await user.click(screen.getByRole('button', { name: 'Revoke the key' }));
    await waitFor(() => expect(revoke).toHaveBeenCalledOnce());
  });

  it('stays open and says why when the act fails', async () => {
    const user = renderRevoke(() =>
      Promise.reject(
        new ApiError({ code: 'forbidden', status: 403, detail: 'Only an integrator may revoke keys.' }),
      ),
    );
    await user.click(screen.getByRole('button', { name: 'Revoke' }));
    await user.click(screen.getByRole('button', { name: 'Revoke the key' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Only an integrator may revoke keys.');
  });
});
