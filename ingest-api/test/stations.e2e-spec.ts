import type TestAgent from 'supertest/lib/agent.js';
import type { StationDto } from '../src/stations/dto/station.dto.js';
import { aResult } from './builders.js';
import { createTestApp, startOfTest, type TestApp } from './create-test-app.js';

const minute = 60_000;
const iso = (time: number): string => new Date(time).toISOString();

describe('stations', () => {
  let test: TestApp;
  let integrator: TestAgent;
  beforeEach(async () => {
    test = await createTestApp();
    integrator = await test.as('integrator');
  });
  afterEach(() => test.close());
  const list = async (): Promise<StationDto[]> => (await integrator.get('/api/v1/stations').expect(200)).body;
  const station = async (name: string) => (await list()).find((one) => one.station === name)!;

  it('are listed by name with their instruments, whose calibration may be overdue', async () => {
    const [first, second] = await list();
    expect(first).toEqual({
      station: 'north-1',
      line: 'north',
      active: true,
      state: 'neverPosted',
      lastPostAt: null,
      lastHeartbeatAt: null,
      latest: null,
      postsToday: 0,
      refusedToday: 0,
      clockSkewSeconds: null,
      goldenDueAt: null,
      instruments: [
        expect.objectContaining({
          kind: 'ammeter',
          serialNumber: 'AM-0031',
          calibrationDueOn: '2027-06-30',
          calibrationOverdue: false,
        }),
        expect.objectContaining({ kind: 'voltmeter', serialNumber: 'VM-0107', calibrationOverdue: true }),
      ],
    });
    expect(second).toMatchObject({ station: 'north-2', instruments: [] });
  });

  it('post, and fall quiet after ten minutes', async () => {
    const { body } = await test.post(aResult({ sentAt: iso(startOfTest - 90_000) })).expect(201);
    await test.post('{').expect(400);
    expect(await station('north-1')).toMatchObject({
      state: 'posting',
      lastPostAt: iso(startOfTest),
      latest: { resultId: body.resultId },
      postsToday: 1,
      refusedToday: 1,
      clockSkewSeconds: 90,
    });
    test.clock.now += 10 * minute;
    expect((await station('north-1')).state).toBe('posting');
    test.clock.now += 1;
    expect((await station('north-1')).state).toBe('quiet');
    expect((await station('north-2')).state).toBe('neverPosted');
  });

  it('owe a golden check a day after the last one', async () => {
    const startedAt = iso(startOfTest - 60 * minute);
    await test.post(aResult({ runKind: 'golden', serialNumber: 'GOLD-1', startedAt })).expect(201);
    expect((await station('north-1')).goldenDueAt).toBe(iso(startOfTest + 23 * 60 * minute));
  });

  it('can be added, and get keys at once', async () => {
    const added = await integrator
      .post('/api/v1/stations')
      .send({ station: 'south-3', line: 'south <b>hall</b>' })
      .expect(201);
    expect(added.body).toMatchObject({ station: 'south-3', line: 'south <b>hall</b>', state: 'neverPosted' });
    await test.post(aResult(), await test.keyFor('south-3')).expect(201);
    expect((await list()).map((one) => one.station)).toEqual(['north-1', 'north-2', 'south-3']);
  });

  it('are not added twice, even by two people at the same moment', async () => {
    const wanted = { station: 'south-3', line: 'south' };
    const answers = await Promise.all(
      Array.from({ length: 4 }, () => integrator.post('/api/v1/stations').send(wanted)),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409, 409]);
    expect(answers.find(({ status }) => status === 409)!.body.code).toBe('station_exists');
    expect(await list()).toHaveLength(3);
  });

  it.each<[string, object, string]>([
    ['capital letters', { station: 'South-3', line: 'south' }, '/station'],
    ['a step up', { station: '..', line: 'south' }, '/station'],
    ['no name', { line: 'south' }, '/station'],
    ['a long name', { station: 'x'.repeat(41), line: 'south' }, '/station'],
    ['a blank line', { station: 'south-3', line: ' ' }, '/line'],
    ['a wish unknown', { station: 'south-3', line: 'south', active: false }, '/active'],
  ])('are not added with %s', async (_, wanted, pointer) => {
    const { body } = await integrator.post('/api/v1/stations').send(wanted).expect(422);
    expect(body.errors.map((error: { pointer: string }) => error.pointer)).toContain(pointer);
    expect(await list()).toHaveLength(2);
  });
});
