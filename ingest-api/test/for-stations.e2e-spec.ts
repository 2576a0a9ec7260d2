import { randomUUID } from 'node:crypto';
import { aFailingResult, aResult } from './builders.js';
import { HeartbeatsService } from '../src/stations/heartbeats.service.js';
import { Heartbeat } from '../src/stations/models/heartbeat.model.js';
import { createTestApp, type TestApp } from './create-test-app.js';

describe('what stations ask', () => {
  let test: TestApp;
  let key: string;
  beforeAll(async () => {
    test = await createTestApp();
    key = await test.keyFor('north-2');
  });
  afterAll(() => test.close());

  const route = async (serialNumber: string, stage: string) =>
    (
      await test.http
        .get(`/api/v1/units/FH-R500-W/${serialNumber}/route`)
        .query({ stage })
        .set('X-API-Key', key)
        .expect(200)
    ).body;
  const plan = () =>
    test.http
      .get('/api/v1/test-plans/current')
      .query({ partNumber: 'FH-R500-W', stage: 'final' })
      .set('X-API-Key', key);

  describe('GET /api/v1/units/{partNumber}/{serialNumber}/route', () => {
    it('lets a unit never seen begin at the first stage, and at no other', async () => {
      expect(await route('R0', 'board')).toMatchObject({
        mayBeTested: true,
        reason: null,
        attempts: 0,
        attemptsLeft: 3,
        priorStagePassed: null,
      });
      expect(await route('R0', 'final')).toMatchObject({
        mayBeTested: false,
        reason: 'It has not passed board.',
        priorStagePassed: false,
      });
    });

    it('sends a unit on that passed, and not through the same stage again', async () => {
      await test.post(aResult({ serialNumber: 'R1' })).expect(201);
      expect(await route('R1', 'board')).toMatchObject({
        mayBeTested: false,
        reason: 'It has passed board already.',
      });
      expect(await route('R1', 'final')).toMatchObject({ mayBeTested: true, priorStagePassed: true });
    });

    it('ends with the last attempt', async () => {
      for (let attempt = 0; attempt < 3; attempt += 1)
        await test.post(aFailingResult({ serialNumber: 'R2', resultId: randomUUID() })).expect(201);
      expect(await route('R2', 'board')).toMatchObject({
        mayBeTested: false,
        attemptsLeft: 0,
        reason: 'It has had all its 3 attempts at board.',
      });
    });

    it('knows no stage that the product has not', async () => {
      await test.http
        .get('/api/v1/units/FH-R500-W/R1/route')
        .query({ stage: 'paint' })
        .set('X-API-Key', key)
        .expect(404);
      await test.http.get('/api/v1/units/FH-R500-W/R1/route').set('X-API-Key', key).expect(422);
    });
  });

  describe('GET /api/v1/test-plans/current', () => {
    it('gives load steps and limits in force, and says that a golden check is owed', async () => {
      const { body } = await plan().expect(200);
      expect(body).toMatchObject({
        testPlan: { version: 1, referenceVolts: 4, loadVolts: [0, 1.2, 2.4, 3.6, 4.8, 6, 7.2, 8] },
        limitSet: { version: 1 },
        goldenSerialNumbers: ['GOLD-1'],
        goldenCheckDueAt: new Date(test.clock.now).toISOString(),
      });
    });

    it('puts the next golden check a day after the last one', async () => {
      await test
        .post(
          aResult({ serialNumber: 'GOLD-1', runKind: 'golden', startedAt: '2026-11-30T09:00:00.000Z' }),
          key,
        )
        .expect(201);
      expect((await plan().expect(200)).body.goldenCheckDueAt).toBe('2026-12-01T09:00:00.000Z');
    });
  });

  describe('POST /api/v1/heartbeats', () => {
    const beat = (body: object) => test.http.post('/api/v1/heartbeats').set('X-API-Key', key).send(body);
    const northTwo = async () => {
      const viewer = await test.as('viewer');
      const { body } = await viewer.get('/api/v1/stations').expect(200);
      return body.find((station: { station: string }) => station.station === 'north-2');
    };

    it("answers the server's time and how far the station's clock is off", async () => {
      const sentAt = new Date(test.clock.now - 95_000).toISOString();
      const { body } = await beat({ sentAt }).expect(200);
      expect(body).toEqual({ serverTime: new Date(test.clock.now).toISOString(), clockSkewSeconds: 95 });
      expect(await northTwo()).toMatchObject({
        lastHeartbeatAt: body.serverTime,
        clockSkewSeconds: 95,
        state: expect.any(String),
      });
    });

    it('is content with no time at all, and refuses one that is none', async () => {
      expect((await beat({}).expect(200)).body.clockSkewSeconds).toBeNull();
      expect((await beat({ sentAt: 'yesterday' }).expect(422)).body.errors[0].pointer).toBe('/sentAt');
    });

    it('outlives the server by its next save', async () => {
      await beat({}).expect(200);
      await test.app.get(HeartbeatsService, { strict: false }).save();
      expect((await Heartbeat.findAll()).map(({ at }) => at)).toEqual([test.clock.now]);
    });
  });
});
