import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { answer, refuse } from '@/testing/handlers';
import { aProduct } from '@/testing/product-builders';
import { renderRoute } from '@/testing/render-route';
import { aYieldGroup, aYieldReport } from '@/testing/yield-builders';
import { aYield } from '@/testing/builders';

vi.mock('@/components/ui/chart', () => ({
  Chart: ({ label, onPick }: { label: string; onPick?: (index: number) => void }) => (
    <button type="button" aria-label={label} onClick={() => onPick?.(0)} />
  ),
}));

const products = answer('GET', '/products', [aProduct()]);
const period = 'from=2026-11-29&to=2026-11-30';
const firstDay = '/units?of=firstAttempt&from=2026-11-29&to=2026-11-29';
const page = (query = '', report = aYieldReport()) =>
  renderRoute(`/yield?${period}${query}`, [
    products,
    answer('GET', '/yields', report),
    answer('GET', '/units', { items: [], nextCursor: null }),
  ]);

describe('Yield', () => {
  it('asks for what stands in the address, and leaves out what it does not know', async () => {
    const asked: string[] = [];
    renderRoute(`/yield?${period}&by=week&split=lot&station=north-1&nonsense=1&stage=`, [
      products,
      answer('GET', '/yields', (_: Request, url: URL) => {
        asked.push(url.search);
        return aYieldReport();
      }),
    ]);
    await screen.findByRole('heading', { name: 'Trend' });
    expect(asked).toEqual([`?${period}&by=week&split=lot&station=north-1`]);
    expect(screen.getByLabelText('Split by')).toHaveValue('lot');
  });

  it('asks for the last 14 days by day when the address says nothing', async () => {
    let asked = new URLSearchParams();
    renderRoute('/yield?to=2026-11-30', [
      products,
      answer('GET', '/yields', (_: Request, url: URL) => {
        asked = url.searchParams;
        return aYieldReport();
      }),
    ]);
    await screen.findByRole('heading', { name: 'Trend' });
    expect(Object.fromEntries(asked)).toEqual({ from: '2026-11-17', to: '2026-11-30', by: 'day' });
  });

  it('leads from a point, and from its row in the table, to the units that pull it down', async () => {
    const { user, router } = page('&stage=final');
    await user.click(await screen.findByText('The trend as a table'));
    const row = screen.getByRole('link', { name: /^Sun,? 29 Nov/ });
    expect(row).toHaveAttribute('href', `${firstDay}&stage=final&verdict=fail`);
    await user.click(screen.getByRole('button', { name: /first-pass and final yield by day/i }));
    await waitFor(() => expect(router.state.location.pathname).toBe('/units'));
    expect(router.state.location.pathname + router.state.location.search).toBe(
      `${firstDay}&stage=final&verdict=fail`,
    );
  });

  it('ranks what fails, with the way to the units that failed it', async () => {
    page();
    const table = await screen.findByRole('table', { name: /failing measures/i });
    const [, first] = within(table).getAllByRole('row');
    expect(first).toHaveTextContent(/Output impedance.*4.*80/);
    expect(within(table).getByRole('link', { name: '4' })).toHaveAttribute(
      'href',
      '/units?of=firstAttempt&from=2026-11-29&to=2026-11-30&verdict=fail&failedMeasure=outputImpedance',
    );
  });

  it('names a pass at the second try as a sign of a measuring problem', async () => {
    page();
    expect(await screen.findByText(/sign of a measuring problem/)).toBeInTheDocument();
    expect(screen.getByText('Passed at the second try').parentElement).toHaveTextContent('4 of 7 retested');
  });

  it('lists what changed under the letter that marks it', async () => {
    const markers = [
      { at: '2026-11-29T10:00:00.000Z', kind: 'limitSet' as const, text: 'FH-R500-W final: limits 3' },
      { at: '2026-11-29T11:00:00.000Z', kind: 'program' as const, text: 'FH-R500-W final: fh-final 3.5.0' },
    ];
    page('', aYieldReport({ markers }));
    const list = await screen.findByRole('list', { name: /changes marked/i });
    expect(list).toHaveTextContent(/^A.*limits 3.*new limits in force.*fh-final 3\.5\.0/);
  });

  it('shows each group of a split and narrows to one', async () => {
    const groups = [aYieldGroup(), aYieldGroup({ name: null, firstPass: aYield({ total: 3 }) })];
    const { user, router } = page('&split=station', aYieldReport({ groups }));
    const table = await screen.findByRole('table', { name: 'First-pass yield by station' });
    expect(within(table).getByText('not said')).toBeInTheDocument();
    await user.click(within(table).getByRole('link', { name: 'north-1' }));
    await waitFor(() => expect(router.state.location.search).toBe(`?${period}&by=day&station=north-1`));
  });

  it('compares with the target only where one product and stage are meant', async () => {
    page('&partNumber=FH-R500-W&stage=final');
    expect(await screen.findByText(/^target 95/)).toBeInTheDocument();
  });

  it('says that nothing fits, or why the yields could not be had', async () => {
    const none = aYield({ passed: 0, total: 0, share: null, low: null, high: null });
    const empty = aYieldReport({
      whole: { firstPass: none, final: none, failed: 0, notProven: 0, openUnits: 0 },
    });
    const { unmount } = page('&lot=L1', empty);
    expect(await screen.findByText('No first attempt fits.')).toBeInTheDocument();
    unmount();
    renderRoute('/yield', [products, refuse('GET', '/yields', { status: 422, detail: 'Lies before from.' })]);
    expect(await screen.findByRole('alert')).toHaveTextContent('Lies before from.');
  });
});
