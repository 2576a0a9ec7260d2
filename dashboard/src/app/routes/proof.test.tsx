import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { aSession } from '@/testing/builders';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';
import { aProof, aProofRow } from '@/testing/settings-builders';

describe('the proof', () => {
  it('shows each figure as published and as computed, and what it comes to', async () => {
    renderRoute('/settings/proof', [answer('GET', '/proof', aProof())]);
    expect(await screen.findByText('The one figure agrees to the digits required.')).toBeVisible();
    const row = screen.getByRole('row', { name: /estimate.B1/ });
    expect(within(row).getAllByText('1.00211681802045')).toHaveLength(2);
    expect(within(row).getByText('agrees')).toBeVisible();
    expect(screen.getByText('NIST Statistical Reference Datasets (source read)')).toBeVisible();
  });

  it('puts what falls short first', async () => {
    renderRoute('/settings/proof', [
      answer(
        'GET',
        '/proof',
        aProof([
          aProofRow(),
          aProofRow({ caseId: 'other', title: 'Another case', quantity: 'a good one' }),
          aProofRow({
            caseId: 'other',
            title: 'Another case',
            quantity: 'a bad one',
            computed: '1.0',
            ok: false,
          }),
        ]),
      ),
    ]);
    expect(await screen.findByText('1 figure of 3 falls short of the digits required.')).toBeVisible();
    const rows = screen.getAllByRole('row').map((row) => row.textContent);
    expect(rows[1]).toContain('Another case');
    expect(rows[2]).toContain('a bad one');
    expect(rows[2]).toContain('falls short');
    expect(rows.at(-1)).toContain('estimate.B1');
  });

  it('says what is going on while the server computes', async () => {
    let finish: (proof: unknown) => void = () => {};
    const computing = new Promise((resolve) => (finish = resolve));
    renderRoute('/settings/proof', [answer('GET', '/proof', () => computing)]);
    expect(await screen.findByText('The server computes every published case anew.')).toBeVisible();
    expect(screen.getByRole('button', { name: 'Print' })).toBeDisabled();
    finish(aProof());
    expect(await screen.findByText(/agrees to the digits required/)).toBeVisible();
  });

  it('is computed again when asked for', async () => {
    let times = 0;
    const { user } = renderRoute('/settings/proof', [
      answer('GET', '/proof', () => {
        times += 1;
        return aProof();
      }),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Compute again' }));
    await waitFor(() => expect(times).toBe(2));
  });

  it('prints', async () => {
    const print = vi.fn();
    vi.stubGlobal('print', print);
    const { user } = renderRoute('/settings/proof', [answer('GET', '/proof', aProof())]);
    await screen.findByText(/agrees to the digits required/);
    await user.click(screen.getByRole('button', { name: 'Print' }));
    expect(print).toHaveBeenCalledOnce();
  });

  it('offers to try again after a failure', async () => {
    renderRoute('/settings/proof', [refuse('GET', '/proof', { status: 503, detail: 'The worker stopped.' })]);
    expect(await screen.findByText('The worker stopped.')).toBeVisible();
    expect(screen.getByRole('button', { name: 'Try again' })).toBeVisible();
  });

  it('is not asked for by those who may not see it', async () => {
    renderRoute('/settings/proof', [answer('GET', '/session', aSession({ role: 'viewer' }))]);
    expect(
      await screen.findByText('Production engineers, quality leads and administrators may see the proof.'),
    ).toBeVisible();
  });
});
