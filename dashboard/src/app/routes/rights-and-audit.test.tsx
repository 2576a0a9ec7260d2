import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aSession } from '@/testing/builders';
import { answer, refuse } from '@/testing/handlers';
import { renderRoute } from '@/testing/render-route';
import { anAuditEntry, aRight } from '@/testing/settings-builders';

describe('the table of rights', () => {
  it('shows for each act which roles may', async () => {
    renderRoute('/settings/rights', [
      answer('GET', '/rights', [
        aRight(),
        aRight({ path: '/api/v1/results', summary: 'Post a result', access: 'station', roles: [] }),
      ]),
    ]);
    const heads = (await screen.findAllByRole('columnheader')).map((head) => head.textContent);
    const mayOf = (act: RegExp) =>
      within(screen.getByRole('row', { name: act }))
        .getAllByRole('cell')
        .flatMap((cell, place) => (within(cell).queryByLabelText('may') ? [heads[place + 1]] : []));
    expect(mayOf(/Add a station/)).toEqual(['Integrator', 'Administrator']);
    expect(mayOf(/Post a result/)).toEqual(['Station key']);
  });

  it('says why it does not come', async () => {
    renderRoute('/settings/rights', [refuse('GET', '/rights', { status: 503, detail: 'Not now.' })]);
    expect(await screen.findByText('Not now.')).toBeVisible();
  });
});

describe('the audit trail', () => {
  it('says in words who did what', async () => {
    renderRoute('/settings/audit', [
      answer('GET', '/audit', {
        items: [anAuditEntry(), anAuditEntry({ auditId: 11, action: 'lot.scrapped', subject: 'L2648-2' })],
        nextCursor: null,
      }),
    ]);
    const row = await screen.findByRole('row', { name: /k7m2p9qx/ });
    expect(within(row).getByText('revoked an API key')).toBeVisible();
    expect(screen.getByText('lot.scrapped')).toBeVisible();
  });

  it('pages to older rows', async () => {
    const { user } = renderRoute('/settings/audit', [
      answer('GET', '/audit', (_request: Request, url: URL) =>
        url.searchParams.has('cursor')
          ? { items: [anAuditEntry({ subject: 'an older one' })], nextCursor: null }
          : { items: [anAuditEntry()], nextCursor: '12' },
      ),
    ]);
    await user.click(await screen.findByRole('button', { name: 'Older' }));
    expect(await screen.findByText('an older one')).toBeVisible();
  });

  it('is kept from an integrator, with the reason', async () => {
    renderRoute('/settings/audit', [answer('GET', '/session', aSession({ role: 'integrator' }))]);
    expect(
      await screen.findByText('Quality leads and administrators may read the audit trail.'),
    ).toBeVisible();
  });
});
