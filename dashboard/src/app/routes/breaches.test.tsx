import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aBreach } from '@/testing/builders';
import { FakeEventSource } from '@/testing/fake-event-source';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';

const byState = answer('GET', '/breaches', (_request: Request, url: URL) => {
  const state = url.searchParams.get('state');
  const items = [
    aBreach({ breachId: 1, title: 'An open one' }),
    aBreach({
      breachId: 2,
      title: 'A closed one',
      state: 'closed',
      closedBy: 'lead@fernhollow.example',
      closedAt: '2026-11-30T09:00:00.000Z',
    }),
  ].filter((breach) => state === 'all' || breach.state === state);
  return { items, nextCursor: null };
});

describe('the Breaches page', () => {
  it('begins with the open ones, each with slope, count and the way to its page', async () => {
    renderRoute('/breaches', [byState]);
    const row = await screen.findByRole('row', { name: /An open one/ });
    expect(within(row).getByRole('link', { name: 'An open one' })).toHaveAttribute('href', '/breaches/1');
    expect(within(row).getByRole('img', { name: /Output impedance/ })).toBeVisible();
    expect(within(row).getByText('Open, nobody has it yet')).toBeVisible();
    expect(screen.queryByText('A closed one')).toBeNull();
  });

  it('takes the state from the address and puts it there', async () => {
    const { user, router } = renderRoute('/breaches?state=closed', [byState]);
    expect(await screen.findByText('A closed one')).toBeVisible();
    expect(screen.getByText(/Closed by lead@fernhollow.example/)).toBeVisible();
    await user.click(screen.getByRole('link', { name: 'All' }));
    expect(await screen.findByText('An open one')).toBeVisible();
    expect(router.state.location.search).toBe('?state=all');
    expect(screen.getByRole('link', { name: 'All' })).toHaveAttribute('aria-current', 'page');
  });

  it('pages to older breaches', async () => {
    const { user, router } = renderRoute('/breaches?state=all', [
      answer('GET', '/breaches', (_request: Request, url: URL) =>
        url.searchParams.get('cursor') === '40'
          ? { items: [aBreach({ breachId: 39, title: 'An older one' })], nextCursor: null }
          : { items: [aBreach({ breachId: 41 })], nextCursor: '40' },
      ),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Older' }));
    expect(await screen.findByText('An older one')).toBeVisible();
    expect(router.state.location.search).toBe('?state=all&cursor=40');
  });

  it('says that nothing is open, and what would open one', async () => {
    renderRoute('/breaches', [answer('GET', '/breaches', { items: [], nextCursor: null })]);
    expect(await screen.findByText('No breach is open.')).toBeVisible();
  });

  it('shows a new breach by itself', async () => {
    let items = [] as ReturnType<typeof aBreach>[];
    renderRoute('/breaches', [answer('GET', '/breaches', () => ({ items, nextCursor: null }))]);
    await screen.findByText('No breach is open.');
    items = [aBreach({ title: 'Just opened' })];
    FakeEventSource.latest().send({ topic: 'breaches', id: '1' });
    expect(await screen.findByText('Just opened')).toBeVisible();
  });

  it('says why the list does not come', async () => {
    renderRoute('/breaches', [refuse('GET', '/breaches', { status: 503, detail: 'Not now.' })]);
    expect(await screen.findByText('Not now.')).toBeVisible();
  });
});
