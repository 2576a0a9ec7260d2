import { screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { aResult, aRun, aUnit } from '@/testing/builders';
import { answer, refuse, type Handler } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';
import { aMeasure, aSweep } from '@/testing/sweep-builders';

vi.mock('@/components/ui/chart', () => ({
  Chart: ({ label }: { label: string }) => <div role="img" aria-label={label} />,
}));

const first = aRun({ resultId: 'first', attempt: 1, verdict: 'fail', startedAt: '2026-11-30T07:00:00.000Z' });
const second = aRun({ resultId: 'second', attempt: 2, startedAt: '2026-11-30T08:00:00.000Z' });
const address = '/units/FH-R500-W/W26480417';

function aUnitPage(overrides: { unit?: Handler; second?: Handler } = {}): Handler[] {
  const stages = [{ stage: 'final', maxAttempts: 3, verdict: 'pass' as const, results: [first, second] }];
  return [
    overrides.unit ?? answer('GET', address, aUnit({ stages })),
    answer('GET', '/results/first', aResult({ ...first })),
    overrides.second ?? answer('GET', '/results/second', aResult({ ...second })),
  ];
}

describe('the page of a unit', () => {
  it('shows the newest result, its curve in words and its judging', async () => {
    renderRoute(address, aUnitPage());
    expect(
      await screen.findByRole('img', { name: /deviation from the reference current.*8 points/i }),
    ).toBeInTheDocument();
    expect(screen.getByText(aMeasure().sentence)).toBeInTheDocument();
    const attempts = screen
      .getAllByRole('listitem')
      .filter((item) => item.getAttribute('aria-current') === 'true');
    expect(attempts).toHaveLength(1);
    expect(attempts[0]).toHaveTextContent('Attempt 2');
  });

  it('shows the result the address asks for', async () => {
    renderRoute(`${address}?result=first`, aUnitPage());
    expect(await screen.findByText(/final, attempt 1, tested/)).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Attempt 2' })).toHaveAttribute(
      'href',
      `${address}?result=second`,
    );
  });

  it('holds the points of the curve as a table', async () => {
    renderRoute(address, aUnitPage());
    const table = await screen.findByRole('table', { name: 'Points of the sweep', hidden: true });
    expect(within(table).getAllByRole('row', { hidden: true })).toHaveLength(9);
    expect(within(table).getByText('501.88', { exact: false })).toBeInTheDocument();
  });

  it('warns about a hazardous product', async () => {
    const caution = 'Work by qualified persons only.';
    renderRoute(
      address,
      aUnitPage({
        unit: answer(
          'GET',
          address,
          aUnit({
            caution,
            stages: [{ stage: 'final', maxAttempts: 3, verdict: 'pass', results: [second] }],
          }),
        ),
      }),
    );
    expect(await screen.findByText(caution)).toBeInTheDocument();
  });

  it('says what was noticed about the result', async () => {
    const flagTexts = [{ code: 'curved', text: 'The residuals are curved.' }];
    renderRoute(
      address,
      aUnitPage({ second: answer('GET', '/results/second', aResult({ ...second, flagTexts })) }),
    );
    expect(await screen.findByText('The residuals are curved.')).toBeInTheDocument();
  });

  it('says so when the station sent no points', async () => {
    const empty = aResult({
      ...second,
      abortReason: 'door opened',
      sweep: aSweep({ points: [], line: [], fit: null }),
    });
    renderRoute(address, aUnitPage({ second: answer('GET', '/results/second', empty) }));
    expect(await screen.findByText('This result has no points.')).toBeInTheDocument();
    expect(screen.getByText(/door opened/, { selector: 'div' })).toBeInTheDocument();
  });

  it('shows the post exactly as it came', async () => {
    const sent = '{ "resultId":"second",  "outcome": "completed" }';
    const { user } = renderRoute(address, [
      ...aUnitPage(),
      answer(
        'GET',
        '/results/second/post',
        () => new Response(sent, { headers: { 'content-type': 'application/json' } }),
      ),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Show the post' }));
    expect((await screen.findByText(/"resultId"/)).textContent).toBe(sent);
  });

  it('says that there is no such unit', async () => {
    renderRoute(
      address,
      aUnitPage({
        unit: refuse('GET', address, { status: 404, code: 'unitNotFound', detail: 'No such unit.' }),
      }),
    );
    expect(await screen.findByRole('alert')).toHaveTextContent('No such unit.');
  });
});
