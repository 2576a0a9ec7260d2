import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aSession, aStation } from '@/testing/builders';
import { answer } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';
import { aCreatedKey, aKey, anInstrument } from '@/testing/station-builders';

const station = answer('GET', '/stations', [aStation({ instruments: [anInstrument()] })]);
const asIntegrator = answer('GET', '/session', aSession({ role: 'integrator' }));

describe('a station’s page', () => {
  it('shows its instruments with accuracy and calibration', async () => {
    renderRoute('/stations/north-1', [station, answer('GET', '/stations/north-1/keys', [])]);
    const table = await screen.findByRole('table', { name: 'Instruments of north-1' });
    expect(within(table).getByText('0.02 % of reading + 0.005 % of range')).toBeVisible();
    expect(within(table).getByText('until 31 Mar 2027')).toBeVisible();
  });

  it('says that a station does not exist', async () => {
    renderRoute('/stations/west-9', [station]);
    expect(await screen.findByText('There is no station “west-9”.')).toBeVisible();
  });

  it('keeps a viewer from the keys without asking the server for them', async () => {
    renderRoute('/stations/north-1', [station, answer('GET', '/session', aSession({ role: 'viewer' }))]);
    expect(await screen.findByText(/may see a station’s keys/)).toBeVisible();
  });

  it('shows keys to a quality lead, who may not make or revoke them', async () => {
    renderRoute('/stations/north-1', [station, answer('GET', '/stations/north-1/keys', [aKey()])]);
    expect(await screen.findByText('rack PC, bay 2')).toBeVisible();
    expect(screen.getByText('Integrators and administrators may create and revoke keys.')).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Revoke' })).toBeNull();
  });

  it('shows a new key once, with a way to copy it, and forgets it', async () => {
    const asked: unknown[] = [];
    const { user } = renderRoute('/stations/north-1', [
      asIntegrator,
      station,
      answer('GET', '/stations/north-1/keys', () => (asked.length > 0 ? [aKey({ practice: true })] : [])),
      answer(
        'POST',
        '/stations/north-1/keys',
        async (request: Request) => {
          asked.push(await request.json());
          return aCreatedKey({ practice: true });
        },
        201,
      ),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Create a key' }));
    await user.type(await screen.findByLabelText('Label'), 'rack PC, bay 2');
    await user.type(screen.getByLabelText('Last day'), '2027-06-30');
    await user.click(screen.getByLabelText('Practice key'));
    await user.click(screen.getByRole('button', { name: 'Create key' }));

    expect(await screen.findByText(aCreatedKey().key)).toBeVisible();
    expect(screen.getByText(/shown only this once/)).toBeVisible();
    expect(asked).toEqual([
      { label: 'rack PC, bay 2', practice: true, expiresAt: '2027-06-30T23:59:59.999Z' },
    ]);
    await user.click(screen.getByRole('button', { name: 'Copy key' }));
    expect(await navigator.clipboard.readText()).toBe(aCreatedKey().key);
    await user.click(screen.getByRole('button', { name: 'I have stored it' }));
    await waitFor(() => expect(screen.queryByText(aCreatedKey().key)).toBeNull());
    expect(await screen.findByText('practice')).toBeVisible();
  });

  it('asks before it revokes a key', async () => {
    let keys = [aKey()];
    const { user } = renderRoute('/stations/north-1', [
      asIntegrator,
      station,
      answer('GET', '/stations/north-1/keys', () => keys),
      answer('POST', '/stations/north-1/keys/3/revoke', () => {
        const revoked = aKey({ state: 'revoked', revokedAt: '2026-11-30T09:00:00.000Z' });
        keys = [revoked];
        return revoked;
      }),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Revoke' }));
    expect(await screen.findByText(/cannot be taken back/)).toBeVisible();
    expect(screen.getByText('rack PC, bay 2')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Revoke key' }));
    expect(await screen.findByText(/^Revoked/)).toBeVisible();
    await waitFor(() => expect(screen.queryByRole('button', { name: 'Revoke' })).toBeNull());
  });
});
