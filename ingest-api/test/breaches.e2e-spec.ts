import type TestAgent from 'supertest/lib/agent.js';
import { AuditEntry } from '../src/audit/models/audit-entry.model.js';
import { BreachRecorder } from '../src/breaches/breach-recorder.js';
import { Breach } from '../src/breaches/models/breach.model.js';
import { Writer } from '../src/database/writer.js';
import { OutboxMail } from '../src/mail/models/outbox-mail.model.js';
import { Result } from '../src/results/models/result.model.js';
import { addAccount } from './accounts.builder.js';
import { clearBreaches, storeFails } from './breaches.builder.js';
import { aFailingResult } from './builders.js';
import { createTestApp, emailOf, type TestApp } from './create-test-app.js';

const DAY_MS = 86_400_000;
const qualityLead = emailOf('qualityLead');

describe('breaches', () => {
  let test: TestApp;
  let lead: TestAgent;

  beforeAll(async () => {
    test = await createTestApp();
    lead = await test.as('qualityLead');
  });
  beforeEach(() => clearBreaches(test));
  afterEach(() => jest.restoreAllMocks());
  afterAll(() => test.close());

  const fails = (...wishes: Parameters<typeof storeFails>[2]) => storeFails(test.app, test.clock.now, wishes);
  const get = async (path: string) => (await lead.get(`/api/v1${path}`).expect(200)).body;
  const post = (path: string, body: object, who = lead) => who.post(`/api/v1${path}`).send(body);
  const close = (breachId: number) =>
    post(`/breaches/${breachId}/close`, { cause: 'low Early voltage', action: 'reel returned' });

  describe('opening', () => {
    it('follows from a posted result that fails, in the same transaction', async () => {
      const { body: answer } = await test.post(aFailingResult()).expect(201);
      expect(answer.verdict).toBe('fail');
      const breaches = await get('/breaches');
      expect(breaches.items).toContainEqual(
        expect.objectContaining({
          measure: 'outputImpedance',
          latest: expect.objectContaining({ resultId: answer.resultId }),
        }),
      );
    });

    it.each([
      ['golden', { runKind: 'golden' as const }],
      ['practice', { runKind: 'practice' as const }],
      ['aborted', { outcome: 'aborted' as const, abortReason: 'door open' }],
    ])('never follows from a %s result', async (_, overrides) => {
      await test.post(aFailingResult(overrides)).expect(201);
      expect((await get('/breaches')).items).toEqual([]);
    });

    it('makes one breach and one mail of many fails of one cause', async () => {
      const batch = Array.from({ length: 40 }, (_, index) => ({ serialNumber: `W264804${index}` }));
      await fails(...batch);
      await fails(...batch);
      const { items } = await get('/breaches');
      expect(items).toHaveLength(1);
      expect(items[0]).toMatchObject({
        title: 'Output impedance out of limits: FH-R500-W at final',
        partNumber: 'FH-R500-W',
        stage: 'final',
        measure: 'outputImpedance',
        state: 'open',
        eventCount: 80,
        latest: { serialNumber: 'W26480439' },
      });
      expect(await OutboxMail.count()).toBe(1);
    });

    it('tells product, stage, how bad and the unit in the subject', async () => {
      await fails({});
      const mail = await OutboxMail.findOne();
      expect(mail?.subject).toBe(
        'FH-R500-W at final: output impedance 3.1 MΩ, at least 5 MΩ required (unit W26480417)',
      );
      expect(mail?.messageId).toMatch(/^<breach-1-[0-9a-f]{24}@localhost>$/);
    });

    it('keeps stages and measures apart', async () => {
      await fails({ stageId: 1 }, { failedMeasures: ['outputImpedance', 'complianceVoltage'] });
      const { items } = await get('/breaches');
      expect(items.map((breach: { title: string }) => breach.title)).toEqual([
        'Compliance voltage out of limits: FH-R500-W at final',
        'Output impedance out of limits: FH-R500-W at final',
        'Output impedance out of limits: FH-R500-W at board',
      ]);
    });

    it('takes a stop by the station without a failed measure as a cause of its own', async () => {
      await fails({ failedMeasures: [] });
      const { items } = await get('/breaches');
      expect(items[0]).toMatchObject({
        measure: 'stoppedOnFail',
        title: 'Stopped on a fail: FH-R500-W at final',
      });
    });

    it('mails every active quality lead and nobody else', async () => {
      await addAccount(test.app, { role: 'qualityLead', email: 'deputy@site.example' });
      await addAccount(test.app, { role: 'qualityLead', email: 'left@site.example', active: false });
      await fails({});
      const mails = await OutboxMail.findAll({ order: [['recipient', 'ASC']] });
      expect(mails.map(({ recipient }) => recipient)).toEqual(['deputy@site.example', qualityLead]);
    });

    it('sends no mail for seeded and day-old results', async () => {
      await fails({ seeded: true });
      await fails({ stageId: 1, startedAt: test.clock.now - DAY_MS - 1 });
      expect((await get('/breaches')).items).toHaveLength(2);
      expect(await OutboxMail.count()).toBe(0);
    });

    it('mails at the first fresh fail of a breach that nobody was told of', async () => {
      await fails({ seeded: true });
      await fails({}, {});
      await fails({});
      expect(await Breach.count()).toBe(1);
      expect(await OutboxMail.count()).toBe(1);
    });

    it('mails nobody about what was acknowledged before', async () => {
      await fails({ seeded: true });
      await post('/breaches/1/acknowledge', { note: 'known' }).expect(200);
      await fails({});
      expect(await OutboxMail.count()).toBe(0);
    });

    it('stores neither result nor breach nor mail when the transaction fails', async () => {
      const recorder = test.app.get(BreachRecorder, { strict: false });
      const record = recorder.record.bind(recorder);
      const results = await Result.count();
      jest.spyOn(recorder, 'record').mockImplementation(async (...args) => {
        await record(...args);
        throw new Error('the last insert failed');
      });
      await expect(fails({})).rejects.toThrow('the last insert failed');
      expect(await Promise.all([Result.count(), Breach.count(), OutboxMail.count()])).toEqual([
        results,
        0,
        0,
      ]);
    });

    it('needs a fixed number of statements, however many fail', async () => {
      const writer = test.app.get(Writer);
      const connection = (
        writer as unknown as { transaction: { connection: { run: unknown; all: unknown } } }
      ).transaction.connection;
      const all = jest.spyOn(connection, 'all' as never);
      const run = jest.spyOn(connection, 'run' as never);
      const recorder = test.app.get(BreachRecorder, { strict: false });
      const record = recorder.record.bind(recorder);
      let statements = 0;
      jest.spyOn(recorder, 'record').mockImplementation(async (...args) => {
        const before = all.mock.calls.length + run.mock.calls.length;
        const recorded = await record(...args);
        statements = all.mock.calls.length + run.mock.calls.length - before;
        return recorded;
      });
      await fails(...Array.from({ length: 30 }, (_, index) => ({ serialNumber: `W${index}` })));
      expect(statements).toBe(6);
      await fails(...Array.from({ length: 30 }, (_, index) => ({ serialNumber: `W${index}` })));
      expect(statements).toBe(3);
    });
  });

  describe('their life', () => {
    it('shows the results that belong to one, newest first, with the judging in words', async () => {
      await fails({ serialNumber: 'W1' });
      test.clock.now += 60_000;
      await fails({ serialNumber: 'W2' });
      const breach = await get('/breaches/1');
      expect(breach.events.map((event: { run: { serialNumber: string } }) => event.run.serialNumber)).toEqual(
        ['W2', 'W1'],
      );
      expect(breach.events[0].text).toMatch(/^Output impedance is .*at least 5 MΩ is required, so it fails/);
      expect(breach.events[0].at).toBe('2026-11-30T12:01:00.000Z');
      expect(breach).toMatchObject({
        openedAt: '2026-11-30T12:00:00.000Z',
        lastEventAt: '2026-11-30T12:01:00.000Z',
        mails: [{ to: qualityLead, attempts: expect.any(Number) }],
      });
    });

    it('is acknowledged with a note, once', async () => {
      await fails({});
      const who = await test.as('productionEngineer');
      const { body } = await post('/breaches/1/acknowledge', { note: '  on it ' }, who).expect(200);
      expect(body).toMatchObject({
        state: 'acknowledged',
        acknowledgedBy: emailOf('productionEngineer'),
        acknowledgedAt: '2026-11-30T12:00:00.000Z',
        note: 'on it',
      });
      const again = await post('/breaches/1/acknowledge', { note: 'me too' }).expect(409);
      expect(again.body).toMatchObject({
        code: 'breach_acknowledged',
        detail: `${emailOf('productionEngineer')} acknowledged it already.`,
      });
    });

    it('still takes further fails while acknowledged', async () => {
      await fails({});
      await post('/breaches/1/acknowledge', { note: 'on it' }).expect(200);
      await fails({});
      expect((await get('/breaches')).items).toMatchObject([{ state: 'acknowledged', eventCount: 2 }]);
    });

    it('is closed with cause and action, for good; then a fail opens a new one and mails again', async () => {
      await fails({});
      const { body } = await close(1).expect(200);
      expect(body).toMatchObject({
        state: 'closed',
        closedBy: qualityLead,
        cause: 'low Early voltage',
        action: 'reel returned',
      });
      await close(1).expect(409);
      await post('/breaches/1/acknowledge', { note: 'late' }).expect(409);
      await fails({});
      expect((await get('/breaches?state=open')).items).toMatchObject([{ breachId: 2, eventCount: 1 }]);
      expect((await get('/breaches?state=closed')).items).toMatchObject([{ breachId: 1, eventCount: 1 }]);
      expect(await OutboxMail.count()).toBe(2);
    });

    it('leaves a trail', async () => {
      await fails({});
      await post('/breaches/1/acknowledge', { note: 'on it' }).expect(200);
      await close(1).expect(200);
      const trail = await AuditEntry.findAll({
        where: { subject: 'breach 1' },
        order: [['auditEntryId', 'DESC']],
        limit: 2,
        raw: true,
      });
      expect(trail).toMatchObject([
        {
          actor: qualityLead,
          action: 'breach.closed',
          detail: 'Cause: low Early voltage Action: reel returned',
        },
        { actor: qualityLead, action: 'breach.acknowledged', detail: 'on it' },
      ]);
    });

    it.each([
      ['no', {}],
      ['a blank', { note: '   ' }],
      ['an endless', { note: 'x'.repeat(2001) }],
    ])('is not acknowledged with %s note', async (_, body) => {
      await fails({});
      const { body: problem } = await post('/breaches/1/acknowledge', body).expect(422);
      expect(problem.errors[0].pointer).toBe('/note');
    });

    it('answers 404 for one that is not there and 400 for what is no number', async () => {
      await lead.get('/api/v1/breaches/7').expect(404);
      await post('/breaches/7/acknowledge', { note: 'x' }).expect(404);
      await close(7).expect(404);
      await lead.get('/api/v1/breaches/seven').expect(400);
    });

    it('lists in pages, newest opened first', async () => {
      await fails({ failedMeasures: ['outputImpedance', 'complianceVoltage', 'setpointError'] });
      const first = await get('/breaches?limit=2');
      const second = await get(`/breaches?limit=2&cursor=${first.nextCursor}`);
      const idsOf = ({ items }: { items: { breachId: number }[] }) => items.map(({ breachId }) => breachId);
      expect([idsOf(first), idsOf(second), second.nextCursor]).toEqual([[3, 2], [1], null]);
    });
  });
});
