import type TestAgent from 'supertest/lib/agent.js';
import { Outbox } from '../src/mail/outbox.js';
import { addAccount } from './accounts.builder.js';
import { storeFails } from './breaches.builder.js';
import { createTestApp, emailOf, type TestApp } from './create-test-app.js';

const lead = emailOf('qualityLead');
const deputy = 'deputy@site.example';

describe('the local mailbox', () => {
  let test: TestApp;
  let who: TestAgent;

  const start = async (settings: Record<string, string> = {}) => {
    test = await createTestApp(settings);
    who = await test.as('qualityLead');
  };
  afterEach(() => test.close());

  const get = (path: string) => who.get(`/api/v1${path}`);

  it('shows what the quality lead gets for a failing unit', async () => {
    await start();
    await storeFails(test.app, test.clock.now, [{ serialNumber: '<b>W1</b>' }]);
    await test.app.get(Outbox).deliverDue();
    const { body: page } = await get('/mailbox').expect(200);
    expect(page).toMatchObject({
      addresses: [lead],
      items: [
        {
          to: [lead],
          subject: 'FH-R500-W at final: output impedance 3.1 MΩ, at least 5 MΩ required (unit <b>W1</b>)',
          receivedAt: '2026-11-30T12:00:00.000Z',
          messageId: expect.stringMatching(/^<breach-1-/),
        },
      ],
    });
    const mail = await get(`/mailbox/${page.items[0].mailId}`)
      .expect(200)
      .expect('Content-Type', /^application\/json/);
    expect(mail.body).toMatchObject(page.items[0]);
    expect(mail.body.text).toContain(`Open the breach: ${test.env.publicUrl}/breaches/1`);
    expect(mail.body.html).toContain('&lt;b&gt;W1&lt;/b&gt;');
    expect(mail.body.html).not.toContain('<b>');
  });

  it('is sorted by person', async () => {
    await start();
    await addAccount(test.app, { role: 'qualityLead', email: deputy });
    await storeFails(test.app, test.clock.now, [{ stageId: 1 }, { stageId: 2 }]);
    await test.app.get(Outbox).deliverDue();
    const { body } = await get(`/mailbox?to=${deputy.toUpperCase()}`).expect(200);
    expect(body.addresses).toEqual([deputy, lead]);
    expect(body.items.map(({ to }: { to: string[] }) => to)).toEqual([[deputy], [deputy]]);
  });

  it('answers 404 for a mail that is not there', async () => {
    await start();
    await get('/mailbox/1796025342010-9f86d081884c').expect(404);
    await get('/mailbox/..%2Fampkeep').expect(404);
    await get('/mailbox?to=nobody').expect(422);
  });

  it("doesn't exist when mails go out for real", async () => {
    await start({ AMPKEEP_MAIL_TRANSPORT: 'smtp', AMPKEEP_SMTP_URL: 'smtp://127.0.0.1:9' });
    await get('/mailbox').expect(404);
    await get('/mailbox/1796025342010-9f86d081884c').expect(404);
  });
});
