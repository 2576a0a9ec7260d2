import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aSite } from '@/testing/builders';
import { FakeEventSource } from '@/testing/fake-event-source';
import { answer, refuse } from '@/testing/handlers';
import { aMail, aMailItem } from '@/testing/mail-builders';
import { renderRoute } from '@/testing/render-route';

const localSite = answer('GET', '/site', aSite({ localMailbox: true }));
const second = aMailItem({ mailId: 'second', to: ['second@fernhollow.example'], subject: 'Another breach' });
const addresses = ['lead@fernhollow.example', 'second@fernhollow.example'];
const mailbox = answer('GET', '/mailbox', (_request: Request, url: URL) => {
  const to = url.searchParams.get('to');
  return { addresses, items: [aMailItem(), second].filter((mail) => !to || mail.to.includes(to)) };
});
const mail = answer('GET', `/mailbox/${aMail().mailId}`, aMail());

describe('the local mailbox', () => {
  it('opens a mail beside the inbox, its HTML where no script runs', async () => {
    const { user, router } = renderRoute('/mailbox', [localSite, mailbox, mail]);
    await user.click(await screen.findByRole('link', { name: /output impedance 7.2/ }));
    const frame = await screen.findByTitle(/The mail/);
    expect(frame).toHaveAttribute(
      'sandbox',
      'allow-popups allow-popups-to-escape-sandbox allow-top-navigation-by-user-activation',
    );
    expect(frame.getAttribute('srcdoc')).toContain('<base target="_top">');
    expect(router.state.location.search).toBe(`?mail=${aMail().mailId}`);
    await user.click(screen.getByText('The same as plain text'));
    expect(screen.getByRole('link', { name: 'http://localhost:4780/breaches/1' })).toBeVisible();
  });

  it('shows one person’s mails, and keeps that in the address', async () => {
    const { user, router } = renderRoute('/mailbox', [localSite, mailbox]);
    await user.selectOptions(await screen.findByLabelText('Inbox of'), 'second@fernhollow.example');
    const list = await screen.findByRole('list', { name: 'Mails' });
    expect(await within(list).findAllByRole('listitem')).toHaveLength(1);
    expect(within(list).getByText('Another breach')).toBeVisible();
    expect(router.state.location.search).toBe('?to=second%40fernhollow.example');
  });

  it('shows a new mail by itself', async () => {
    let items = [] as ReturnType<typeof aMailItem>[];
    renderRoute('/mailbox', [localSite, answer('GET', '/mailbox', () => ({ addresses, items }))]);
    expect(await screen.findByText('No mail was sent yet.')).toBeVisible();
    items = [second];
    FakeEventSource.latest().send({ topic: 'mailbox', id: null });
    expect(await screen.findByText('Another breach')).toBeVisible();
  });

  it('shows a mail without HTML as text', async () => {
    renderRoute(`/mailbox?mail=${aMail().mailId}`, [
      localSite,
      mailbox,
      answer('GET', `/mailbox/${aMail().mailId}`, aMail({ html: null, text: '<b>plain</b>' })),
    ]);
    expect(await screen.findByText('<b>plain</b>')).toBeVisible();
    expect(screen.queryByTitle(/The mail/)).toBeNull();
  });

  it('says why a mail does not come', async () => {
    renderRoute('/mailbox?mail=gone', [
      localSite,
      mailbox,
      refuse('GET', '/mailbox/gone', { status: 404, detail: 'This mail is not here.' }),
    ]);
    expect(await screen.findByText('This mail is not here.')).toBeVisible();
  });

  it('does not exist where mails go to a mail server', async () => {
    renderRoute('/mailbox');
    expect(await screen.findByText('There is no local mailbox here.')).toBeVisible();
    expect(screen.queryByRole('link', { name: 'Mailbox' })).toBeNull();
  });
});
