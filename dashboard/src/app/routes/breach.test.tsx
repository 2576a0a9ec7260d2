import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aSession, aSite } from '@/testing/builders';
import { aBreachDetail, anOutboxMail } from '@/testing/breach-builders';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';
import type { BreachDetail } from '@/types/api';

const breach = (overrides: Partial<BreachDetail> = {}) =>
  answer('GET', '/breaches/1', aBreachDetail({ breachId: 1, ...overrides }));

describe('the page of a breach', () => {
  it('says what broke and leads to the curve of the unit that broke it', async () => {
    renderRoute('/breaches/1', [breach()]);
    expect(await screen.findByText(/at least 10 MΩ is required, so it fails/)).toBeVisible();
    expect(screen.getByRole('link', { name: 'W26480399' })).toHaveAttribute(
      'href',
      '/units/FH-R500-W/W26480399?result=0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11',
    );
  });

  it('shows who was mailed and that a mail failed', async () => {
    renderRoute('/breaches/1', [
      answer('GET', '/site', aSite({ localMailbox: true })),
      breach({
        mails: [
          anOutboxMail(),
          anOutboxMail({
            mailId: 8,
            to: 'second@fernhollow.example',
            state: 'failed',
            attempts: 9,
            sentAt: null,
            lastError: '550 no such mailbox',
          }),
        ],
      }),
    ]);
    expect(await screen.findByText('failed after 9 tries')).toBeVisible();
    expect(screen.getByText('550 no such mailbox')).toBeVisible();
    expect(screen.getByRole('link', { name: 'lead@fernhollow.example' })).toHaveAttribute(
      'href',
      '/mailbox?to=lead%40fernhollow.example',
    );
  });

  it('is acknowledged with a note', async () => {
    const asked: unknown[] = [];
    const { user } = renderRoute('/breaches/1', [
      answer('GET', '/breaches/1', () =>
        aBreachDetail({ breachId: 1, state: asked.length > 0 ? 'acknowledged' : 'open' }),
      ),
      answer('POST', '/breaches/1/acknowledge', async (request: Request) => {
        asked.push(await request.json());
        return aBreachDetail({
          breachId: 1,
          state: 'acknowledged',
          acknowledgedBy: 'lead@fernhollow.example',
          note: 'Lot on hold.',
        });
      }),
    ]);
    await user.type(await screen.findByLabelText('Note'), ' Lot on hold. ');
    await user.click(screen.getByRole('button', { name: 'Acknowledge' }));
    expect(await screen.findByRole('heading', { name: 'Close' })).toBeVisible();
    expect(asked).toEqual([{ note: 'Lot on hold.' }]);
    expect(screen.queryByRole('button', { name: 'Acknowledge' })).toBeNull();
  });

  it('is closed with cause and action by a quality lead', async () => {
    const asked: unknown[] = [];
    const { user } = renderRoute('/breaches/1', [
      answer('GET', '/breaches/1', () =>
        aBreachDetail({ breachId: 1, state: asked.length > 0 ? 'closed' : 'acknowledged' }),
      ),
      answer('POST', '/breaches/1/close', async (request: Request) => {
        asked.push(await request.json());
        return aBreachDetail({ breachId: 1, state: 'closed', cause: 'A weak reel.', action: 'Returned it.' });
      }),
    ]);
    await user.type(await screen.findByLabelText('Cause'), 'A weak reel.');
    await user.type(screen.getByLabelText('Action'), 'Returned it.');
    await user.click(screen.getByRole('button', { name: 'Close the breach' }));
    expect(await screen.findByText('Closed')).toBeVisible();
    expect(asked).toEqual([{ cause: 'A weak reel.', action: 'Returned it.' }]);
    expect(screen.queryByRole('button', { name: 'Close the breach' })).toBeNull();
  });

  it('says that somebody else was faster', async () => {
    const { user } = renderRoute('/breaches/1', [
      breach(),
      refuse('POST', '/breaches/1/acknowledge', {
        status: 409,
        code: 'breach_acknowledged',
        detail: 'engineer@fernhollow.example acknowledged it already.',
      }),
    ]);
    await user.type(await screen.findByLabelText('Note'), 'Mine.');
    await user.click(screen.getByRole('button', { name: 'Acknowledge' }));
    expect(await screen.findByText('engineer@fernhollow.example acknowledged it already.')).toBeVisible();
  });

  it('tells a viewer who may acknowledge', async () => {
    renderRoute('/breaches/1', [answer('GET', '/session', aSession({ role: 'viewer' })), breach()]);
    expect(
      await screen.findByText('Production engineers and quality leads may acknowledge a breach.'),
    ).toBeVisible();
    expect(screen.queryByLabelText('Note')).toBeNull();
  });

  it('leaves closing to the quality lead', async () => {
    renderRoute('/breaches/1', [
      answer('GET', '/session', aSession({ role: 'productionEngineer' })),
      breach({ state: 'acknowledged' }),
    ]);
    expect(await screen.findByText('Quality leads may close a breach.')).toBeVisible();
    expect(screen.queryByLabelText('Cause')).toBeNull();
  });

  it('says that there is no such breach', async () => {
    renderRoute('/breaches/9', [
      refuse('GET', '/breaches/9', { status: 404, detail: 'Breach 9 is not here.' }),
    ]);
    expect(await screen.findByText('Breach 9 is not here.')).toBeVisible();
  });
});
