import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aBreach, aRun, aStation, aToday, aTodayProduct, aTodayStage, aYield } from '@/testing/builders';
import { FakeEventSource } from '@/testing/fake-event-source';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';

describe('Today', () => {
  it('tells the state of the line in one sentence', async () => {
    const below = aTodayStage({ firstPass: aYield({ share: 0.8, low: 0.71, high: 0.87 }), target: 0.95 });
    renderRoute('/', [
      answer(
        'GET',
        '/today',
        aToday({ products: [aTodayProduct({ stages: [below] })], openBreaches: [aBreach()] }),
      ),
    ]);
    expect(
      await screen.findByText(/1 stage is below the yield target, 1 breach is open\./),
    ).toBeInTheDocument();
  });

  it('shows each yield with its interval, target and shares', async () => {
    renderRoute('/', [answer('GET', '/today', aToday())]);
    const figure = await screen.findByRole('table', { name: /first-pass yield today/i });
    const bars = within(figure).getAllByRole('img');
    expect(bars[0]?.getAttribute('aria-label')?.replace(/\u202f/g, ' ')).toBe(
      '96.0 %, 96 of 100, 95 % interval 90.2 % to 98.4 %, target 95.0 %',
    );
    expect(within(figure).getAllByRole('link', { name: '3 failed' })[0]).toHaveAttribute(
      'href',
      '/units?partNumber=FH-R500-W&stage=board&verdict=fail',
    );
  });

  it('leads from a breach to its page and from a run to its curve', async () => {
    renderRoute('/', [answer('GET', '/today', aToday({ openBreaches: [aBreach({ breachId: 7 })] }))]);
    expect(await screen.findByRole('link', { name: aBreach().title })).toHaveAttribute('href', '/breaches/7');
    expect(screen.getByRole('link', { name: 'W26480417' })).toHaveAttribute(
      'href',
      `/units/FH-R500-W/W26480417?result=${aRun().resultId}`,
    );
  });

  it('names the product of what gets worse', async () => {
    const change = {
      text: 'First-pass yield fell',
      partNumber: 'FH-R500-W',
      stage: 'final',
      kind: 'firstPass' as const,
      station: null,
    };
    renderRoute('/', [answer('GET', '/today', aToday({ worse: [change] }))]);
    expect(await screen.findByText(/FH-R500-W final:/)).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'See the units' })).toHaveAttribute(
      'href',
      '/units?partNumber=FH-R500-W&stage=final',
    );
  });

  it('says so when nothing has happened yet', async () => {
    renderRoute('/', [answer('GET', '/today', aToday({ products: [], recent: [] }))]);
    expect(await screen.findByText('No result has come in yet.')).toBeInTheDocument();
    expect(screen.getByText('No breach is open.')).toBeInTheDocument();
    expect(screen.getByText('Nothing is getting worse.')).toBeInTheDocument();
  });

  it('offers to try again after an error', async () => {
    let tries = 0;
    const { user } = renderRoute('/', [
      answer('GET', '/today', () =>
        tries++ === 0
          ? Response.json({ code: 'busy', status: 400, detail: 'Not now.' }, { status: 400 })
          : aToday(),
      ),
    ]);
    expect(await screen.findByRole('alert')).toHaveTextContent('Not now.');
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('link', { name: 'W26480417' })).toBeInTheDocument();
  });

  it('shows a result that arrives while the page is open', async () => {
    let recent = [aRun()];
    renderRoute('/', [answer('GET', '/today', () => aToday({ recent }))]);
    await screen.findByRole('link', { name: 'W26480417' });
    recent = [aRun({ resultId: 'new', serialNumber: 'W26480418' }), ...recent];
    FakeEventSource.latest().open();
    FakeEventSource.latest().send({ topic: 'results', id: 'new' });
    expect(await screen.findByRole('link', { name: 'W26480418' })).toBeInTheDocument();
  });

  it('says that the connection is lost, and keeps what it shows', async () => {
    renderRoute('/', [answer('GET', '/today', aToday())]);
    await screen.findByRole('link', { name: 'W26480417' });
    FakeEventSource.latest().open();
    FakeEventSource.latest().break();
    expect(await screen.findByText(/connection lost/i)).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'W26480417' })).toBeInTheDocument();
  });

  it('goes to the sign-in when the session has ended elsewhere', async () => {
    renderRoute('/', [
      refuse('GET', '/today', { status: 401, code: 'notSignedIn', detail: 'Sign in first.' }),
    ]);
    expect(await screen.findByRole('button', { name: 'Sign in' })).toBeInTheDocument();
  });
});

describe('the line strip', () => {
  it('puts troubled stations first and says what is wrong', async () => {
    renderRoute('/', [
      answer('GET', '/today', aToday()),
      answer('GET', '/stations', [aStation(), aStation({ station: 'south-2', state: 'quiet' })]),
    ]);
    const strip = await screen.findByRole('list', { name: 'Stations' });
    const cells = await within(strip).findAllByRole('listitem');
    expect(cells[0]).toHaveTextContent('south-2quiet');
    expect(cells[1]).toHaveTextContent('north-1');
  });
});
