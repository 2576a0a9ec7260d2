import { Writer } from '../src/database/writer.js';
import { OutboxMail } from '../src/mail/models/outbox-mail.model.js';
import { Outbox } from '../src/mail/outbox.js';
import { addAccount } from './accounts.builder.js';
import { clearBreaches, storeFails } from './breaches.builder.js';
import { createTestApp, emailOf, type TestApp } from './create-test-app.js';
import { FaultySmtpServer } from './outbox-smtp-server.js';

const HOUR_MS = 3_600_000;
const lead = emailOf('qualityLead');
const deputy = 'deputy@site.example';

describe('the outbox', () => {
  let smtp: FaultySmtpServer;
  let port: number;
  let test: TestApp;
  let outbox: Outbox;

  beforeAll(async () => {
    smtp = new FaultySmtpServer();
    port = await smtp.listen();
    test = await createTestApp({
      AMPKEEP_MAIL_TRANSPORT: 'smtp',
      AMPKEEP_SMTP_URL: `smtp://127.0.0.1:${port}`,
      AMPKEEP_PUBLIC_URL: 'http://ampkeep.site.example',
    });
    outbox = test.app.get(Outbox);
  });
  beforeEach(async () => {
    await clearBreaches(test);
    await smtp.restart(port);
  });
  afterAll(async () => {
    await test.close();
    await smtp.close();
  });

  const fail = (stageId = 2) => storeFails(test.app, test.clock.now, [{ stageId }]);
  const deliver = () => outbox.deliverDue();
  const deliverAfter = async (pause: number) => {
    test.clock.now += pause;
    await deliver();
  };
  const mailTo = (recipient: string) => OutboxMail.findOne({ where: { recipient }, rejectOnEmpty: true });
  const messageIds = () => smtp.received.map(({ messageId }) => messageId);

  it('sends a mail once, as soon as the breach is committed', async () => {
    await fail();
    await deliver();
    await deliverAfter(HOUR_MS);
    const mail = await mailTo(lead);
    expect(smtp.received).toEqual([{ to: lead, messageId: mail.messageId }]);
    expect(mail).toMatchObject({
      state: 'sent',
      attempts: 1,
      sentAt: Date.parse('2026-11-30T12:00:00Z'),
      lastError: null,
    });
    expect(mail.messageId).toMatch(/@ampkeep\.site\.example>$/);
  });

  it('sends again after a passing refusal, with the same Message-ID', async () => {
    smtp.data.push(451, 451);
    await fail();
    await deliver();
    const refused = await mailTo(lead);
    expect(refused).toMatchObject({
      state: 'waiting',
      attempts: 1,
      lastError: expect.stringContaining('451'),
    });
    await deliver();
    expect((await mailTo(lead)).attempts).toBe(1);
    await deliverAfter(20_000);
    await deliverAfter(40_000);
    expect(messageIds()).toEqual([refused.messageId]);
    expect(await mailTo(lead)).toMatchObject({ state: 'sent', attempts: 3, lastError: null });
  });

  it.each([
    ['recipient', () => (smtp.rcpt = { [lead]: 550 })],
    ['content', () => smtp.data.push(554)],
  ])(
    'gives up at once when the server refuses the %s for good, and shows what it said',
    async (_, refuse) => {
      refuse();
      await fail();
      await deliver();
      await deliverAfter(HOUR_MS);
      expect(smtp.received).toEqual([]);
      const viewer = await test.as('viewer');
      const breach = await viewer.get('/api/v1/breaches/1').expect(200);
      expect(breach.body.mails).toMatchObject([
        {
          to: lead,
          state: 'failed',
          attempts: 1,
          sentAt: null,
          lastError: expect.stringMatching(/^55[04] /),
        },
      ]);
    },
  );

  it('lets a poisoned mail hold up no other', async () => {
    await addAccount(test.app, { role: 'qualityLead', email: deputy });
    await test.app.get(Writer).run((transaction) =>
      OutboxMail.create(
        {
          ...{
            messageId: '<nothing@x>',
            breachId: null,
            recipient: 'nobody@site.example',
            subject: '',
          },
          ...{ state: 'waiting', createdAt: 1, nextTryAt: test.clock.now },
        },
        { transaction },
      ),
    );
    smtp.rcpt = { [lead]: 451 };
    await fail();
    await deliver();
    expect(smtp.received.map(({ to }) => to)).toEqual([deputy]);
    expect((await mailTo(lead)).state).toBe('waiting');
  });

  it('lets a mail that hangs hold up neither its neighbours nor later ones', async () => {
    await addAccount(test.app, { role: 'qualityLead', email: deputy });
    smtp.rcpt = { [lead]: 'hang' };
    await fail(1);
    await smtp.hasTaken(1);
    await fail(2);
    await smtp.hasTaken(2);
    expect(smtp.received.map(({ to }) => to)).toEqual([deputy, deputy]);
    await smtp.close();
    await deliver();
    expect(await OutboxMail.count({ where: { recipient: lead, state: 'waiting' } })).toBe(2);
  });

  it('sends twice with one Message-ID when the line breaks between the end of DATA and the reply', async () => {
    smtp.data.push('drop');
    await fail();
    await deliver();
    await deliverAfter(20_000);
    const { messageId } = await mailTo(lead);
    expect(messageIds()).toEqual([messageId, messageId]);
  });

  it('sends twice with one Message-ID when the process dies before its mark', async () => {
    await fail();
    const writer = test.app.get(Writer);
    const run = writer.run.bind(writer);
    const die = jest.spyOn(writer, 'run').mockImplementation((work) => {
      // The claim goes through; from the first sent mail on nothing is written any more.
      return smtp.received.length === 0 ? run(work) : Promise.reject(new Error('killed'));
    });
    await deliver();
    die.mockRestore();
    const unmarked = await mailTo(lead);
    expect(unmarked).toMatchObject({ state: 'waiting', sentAt: null });
    await deliverAfter(60_000);
    expect(messageIds()).toEqual([unmarked.messageId]);
    await deliverAfter(60_000);
    expect(messageIds()).toEqual([unmarked.messageId, unmarked.messageId]);
    expect(await mailTo(lead)).toMatchObject({ state: 'sent', attempts: 2 });
  });

  it('sends all mails once the server is back after hours', async () => {
    await smtp.close();
    await addAccount(test.app, { role: 'qualityLead', email: deputy });
    for (const stageId of [1, 2]) await fail(stageId);
    await deliver();
    for (let hour = 0; hour < 6; hour += 1) await deliverAfter(HOUR_MS);
    expect(await OutboxMail.count({ where: { state: 'waiting' } })).toBe(4);
    await smtp.listen(port);
    await deliverAfter(2 * HOUR_MS);
    expect(smtp.received).toHaveLength(4);
    expect(new Set(messageIds()).size).toBe(4);
    expect(await OutboxMail.count({ where: { state: 'sent' } })).toBe(4);
  });

  it('gives up after four days and says so', async () => {
    await smtp.close();
    await fail();
    await deliver();
    await deliverAfter(4 * 24 * HOUR_MS);
    expect(await mailTo(lead)).toMatchObject({
      state: 'failed',
      lastError: expect.stringMatching(/^Given up after 4 days\. .*ECONNREFUSED/),
    });
  });
});
