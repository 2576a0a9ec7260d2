import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { aResult, aRun, aStation, aUnit, aUnitItem } from '@/testing/builders';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';

vi.mock('@/components/ui/chart', () => ({
  Chart: ({ label }: { label: string }) => <div role="img" aria-label={label} />,
}));

const products = answer('GET', '/products', []);
const onePage = (items: unknown[], nextCursor: string | null = null) => ({ items, nextCursor });

describe('Units', () => {
  it('asks for what stands in the address', async () => {
    const asked: string[] = [];
    renderRoute('/units?search=W264&verdict=fail&station=north-1&nonsense=1', [
      products,
      answer('GET', '/units', (_: Request, url: URL) => {
        asked.push(url.search);
        return onePage([aUnitItem()]);
      }),
    ]);
    expect(await screen.findByRole('link', { name: 'W26480417' })).toBeInTheDocument();
    expect(asked).toEqual(['?search=W264&station=north-1&verdict=fail']);
    expect(screen.getByLabelText('Serial number')).toHaveValue('W264');
    expect(screen.getByLabelText('Station')).toHaveValue('north-1');
  });

  it('puts a chosen filter into the address and starts at the newest page', async () => {
    const { user, router } = renderRoute('/units?cursor=abc', [
      products,
      answer('GET', '/stations', [aStation()]),
      answer('GET', '/units', onePage([aUnitItem()])),
    ]);
    await screen.findByRole('option', { name: 'north-1' });
    await user.selectOptions(screen.getByLabelText('Station'), 'north-1');
    await waitFor(() => expect(router.state.location.search).toBe('?station=north-1'));
  });

  it('follows what is typed into the search', async () => {
    const { user, router } = renderRoute('/units', [
      products,
      answer('GET', '/units', onePage([aUnitItem()])),
    ]);
    await user.type(await screen.findByLabelText('Serial number'), 'W2648');
    await waitFor(() => expect(router.state.location.search).toBe('?search=W2648'));
  });

  it('goes to older units and back', async () => {
    const { user, router } = renderRoute('/units', [
      products,
      answer('GET', '/units', (_: Request, url: URL) =>
        url.searchParams.has('cursor')
          ? onePage([aUnitItem({ serialNumber: 'OLD-1' })])
          : onePage([aUnitItem({ serialNumber: 'NEW-1' })], 'next'),
      ),
    ]);
    await screen.findByRole('link', { name: 'NEW-1' });
    await user.click(screen.getByRole('button', { name: 'Older' }));
    expect(await screen.findByRole('link', { name: 'OLD-1' })).toBeInTheDocument();
    expect(router.state.location.search).toBe('?cursor=next');
    await user.click(screen.getByRole('button', { name: 'Newer' }));
    expect(await screen.findByRole('link', { name: 'NEW-1' })).toBeInTheDocument();
  });

  it('opens the unit of a scanned code', async () => {
    const { router } = renderRoute('/units?search=w26480417&open=exact', [
      products,
      answer('GET', '/units', onePage([aUnitItem(), aUnitItem({ serialNumber: 'W264804170' })])),
      answer('GET', '/units/FH-R500-W/W26480417', aUnit()),
      answer('GET', `/results/${aRun().resultId}`, aResult()),
    ]);
    await waitFor(() => expect(router.state.location.pathname).toBe('/units/FH-R500-W/W26480417'));
  });

  it('lists the units when a scanned code is not one alone', async () => {
    const { router } = renderRoute('/units?search=W26480417&open=exact', [
      products,
      answer('GET', '/units', onePage([aUnitItem(), aUnitItem({ partNumber: 'FH-R500-M' })])),
    ]);
    expect(await screen.findAllByRole('link', { name: 'W26480417' })).toHaveLength(2);
    expect(router.state.location.pathname).toBe('/units');
  });

  it('says whether nothing fits or nothing is there', async () => {
    const { user } = renderRoute('/units?search=nothing', [products, answer('GET', '/units', onePage([]))]);
    expect(await screen.findByText('No unit fits.')).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Show all units' }));
    expect(await screen.findByText('No unit has been tested yet.')).toBeInTheDocument();
  });

  it('says why the list could not be loaded', async () => {
    renderRoute('/units', [
      products,
      refuse('GET', '/units', { status: 400, detail: 'The cursor is not one of ours.' }),
    ]);
    expect(await screen.findByRole('alert')).toHaveTextContent('The cursor is not one of ours.');
  });

  it('tells stages apart that were passed, failed and not reached', async () => {
    const stages = [
      { stage: 'board', attempts: 2, verdict: 'pass' as const },
      { stage: 'final', attempts: 0, verdict: null },
    ];
    renderRoute('/units', [products, answer('GET', '/units', onePage([aUnitItem({ stages })]))]);
    const row = (await screen.findByRole('link', { name: 'W26480417' })).closest('tr');
    expect(within(row as HTMLElement).getByText(/2 attempts/)).toBeInTheDocument();
    expect(within(row as HTMLElement).getByText(/final not yet/)).toBeInTheDocument();
  });
});
