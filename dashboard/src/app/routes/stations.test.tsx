import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aRun, aSession, aStation } from '@/testing/builders';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';
import { anInstrument } from '@/testing/station-builders';

const asIntegrator = answer('GET', '/session', aSession({ role: 'integrator' }));

describe('the Stations page', () => {
  it('shows state, slope, counts, clock and calibration of each station', async () => {
    const station = aStation({
      station: 'south-1',
      state: 'quiet',
      refusedToday: 4,
      clockSkewSeconds: 47,
      latest: aRun(),
      instruments: [
        anInstrument(),
        anInstrument({
          serialNumber: 'VM-0107',
          calibrationDueOn: '2026-11-15',
          calibrationOverdue: true,
        }),
      ],
    });
    renderRoute('/stations', [answer('GET', '/stations', [station])]);
    const row = await screen.findByRole('row', { name: /south-1/ });
    expect(within(row).getByText('Quiet')).toBeVisible();
    expect(within(row).getByText('47 s late')).toBeVisible();
    expect(within(row).getByText('VM-0107 overdue since 15 Nov 2026')).toBeVisible();
    expect(within(row).getByRole('img', { name: /Output impedance/ })).toBeVisible();
    expect(within(row).getByRole('link', { name: '4 refused today' })).toHaveAttribute(
      'href',
      '/intake?kind=refused&station=south-1',
    );
  });

  it('says what to do when there is no station', async () => {
    renderRoute('/stations');
    expect(await screen.findByText('No station yet.')).toBeVisible();
  });

  it('offers to try again when the list does not come', async () => {
    renderRoute('/stations', [refuse('GET', '/stations', { status: 503, detail: 'Not now.' })]);
    const page = await screen.findByRole('main');
    expect(await within(page).findByText('Not now.')).toBeVisible();
    expect(within(page).getByRole('button', { name: 'Try again' })).toBeVisible();
  });

  it('says who may add stations to those who may not', async () => {
    renderRoute('/stations', [answer('GET', '/session', aSession({ role: 'viewer' }))]);
    expect(await screen.findByText(/Integrators and administrators may add stations/)).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Add a station' })).toBeNull();
  });

  it('adds a station and goes to its page', async () => {
    const asked: unknown[] = [];
    const stations = [aStation()];
    const { user, router } = renderRoute('/stations', [
      asIntegrator,
      answer('GET', '/stations', () => stations),
      answer('GET', '/stations/south-3/keys', []),
      answer(
        'POST',
        '/stations',
        async (request: Request) => {
          asked.push(await request.json());
          const added = aStation({ station: 'south-3', line: 'south', state: 'neverPosted', latest: null });
          stations.push(added);
          return added;
        },
        201,
      ),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Add a station' }));
    await user.type(await screen.findByLabelText('Name'), 'south-3');
    await user.type(screen.getByRole('textbox', { name: 'Line' }), 'south');
    await user.click(screen.getByRole('button', { name: 'Add station' }));
    expect(await screen.findByRole('heading', { level: 1, name: 'south-3' })).toBeVisible();
    expect(router.state.location.pathname).toBe('/stations/south-3');
    expect(asked).toEqual([{ station: 'south-3', line: 'south' }]);
  });

  it('shows a refused name at its field', async () => {
    const { user } = renderRoute('/stations', [
      asIntegrator,
      refuse('POST', '/stations', {
        status: 422,
        errors: [{ pointer: '/station', code: 'matches', detail: 'Small letters, digits and hyphens only.' }],
      }),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Add a station' }));
    const name = await screen.findByLabelText('Name');
    await user.type(name, 'South 3');
    await user.type(screen.getByRole('textbox', { name: 'Line' }), 'south');
    await user.click(screen.getByRole('button', { name: 'Add station' }));
    expect(await screen.findByText('Small letters, digits and hyphens only.')).toBeVisible();
    expect(name).toHaveAttribute('aria-invalid', 'true');
  });
});
