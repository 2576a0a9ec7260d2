import type TestAgent from 'supertest/lib/agent.js';
import type { TodayDto } from '../src/today/dto/today.dto.js';
import { aFailingResult, aResult, sweepOf } from './builders.js';
import { createTestApp, type TestApp } from './create-test-app.js';

describe('today', () => {
  let test: TestApp;
  let viewer: TestAgent;
  const start = async (now: string, settings: Record<string, string> = {}): Promise<void> => {
    test = await createTestApp(settings);
    await at(now);
  };
  /** A session lasts hours; each look is by someone who signs in now. */
  const at = async (now: string): Promise<void> => {
    test.clock.now = Date.parse(now);
    viewer = await test.as('viewer');
  };
  afterEach(() => test.close());
  const today = async (): Promise<TodayDto> => (await viewer.get('/api/v1/today').expect(200)).body;
  const board = async () => (await today()).products[0]!.stages[0]!;
  let unit = 0;
  const passed = (startedAt: string) =>
    test.post(aResult({ serialNumber: `T-${unit++}`, startedAt, finishedAt: undefined })).expect(201);

  it('is empty before the first post, and says so with nulls, not zeros', async () => {
    await start('2026-11-30T12:00:00Z');
    const nothing = { passed: 0, total: 0, share: null, low: null, high: null };
    expect(await today()).toEqual({
      date: '2026-11-30',
      timeZone: 'UTC',
      products: [
        {
          partNumber: 'FH-R500-W',
          description: '500 µA excitation source',
          rolledThroughput: null,
          stages: ['board', 'final'].map((stage) => ({
            stage,
            target: 0.95,
            firstPass: nothing,
            final: nothing,
            previous: nothing,
            failed: 0,
            notProven: 0,
            openUnits: 0,
          })),
        },
      ],
      worse: [],
      openBreaches: [],
      recent: [],
    });
  });

  it('counts units by their first attempt, shows three shares, and what is open', async () => {
    await start('2026-11-30T12:00:00Z');
    const on = (serialNumber: string, hour: number) => ({
      serialNumber,
      startedAt: `2026-11-30T0${hour}:00:00.000Z`,
    });
    const unclear = { ammeter: { resolutionAmps: 1e-5 }, points: sweepOf(1e12) };
    await test.post(aResult(on('A', 1))).expect(201);
    await test.post(aFailingResult(on('B', 1))).expect(201);
    await test.post(aResult(on('B', 2))).expect(201);
    await test.post(aFailingResult(on('C', 1))).expect(201);
    await test.post(aResult({ ...on('D', 1), ...unclear })).expect(201);
    await test.post(aResult({ ...on('A', 3), stage: 'final' })).expect(201);
    const { products, recent, openBreaches } = await today();
    const [first, last] = products[0]!.stages;
    expect(first).toMatchObject({
      firstPass: { passed: 1, total: 4, share: 0.25 },
      final: { passed: 2, total: 4, share: 0.5 },
      failed: 2,
      notProven: 1,
      openUnits: 2,
    });
    expect(last).toMatchObject({ firstPass: { passed: 1, total: 1, share: 1, high: 1 } });
    expect(products[0]!.rolledThroughput!.share).toBeCloseTo(0.25, 12);
    expect(recent.map(({ serialNumber, stage }) => `${serialNumber} ${stage}`)).toEqual([
      'A final',
      'D board',
      'C board',
      'B board',
      'B board',
      'A board',
    ]);
    expect(openBreaches).toMatchObject([{ measure: 'outputImpedance', state: 'open', eventCount: 2 }]);
  });

  it('begins and ends at midnight of the site, on a day of 25 hours too', async () => {
    await start('2026-10-25T22:59:59.999Z', { AMPKEEP_TIME_ZONE: 'Europe/Berlin' });
    for (const startedAt of [
      '2026-10-24T21:59:59.999Z',
      '2026-10-24T22:00:00.000Z',
      '2026-10-25T22:59:59.999Z',
    ]) {
      await passed(startedAt);
    }
    expect(await today()).toMatchObject({ date: '2026-10-25', timeZone: 'Europe/Berlin' });
    expect(await board()).toMatchObject({ firstPass: { total: 2 }, previous: { total: 1 } });
    const stations = await viewer.get('/api/v1/stations').expect(200);
    expect(stations.body[0]).toMatchObject({ station: 'north-1', postsToday: 3 });

    await at('2026-10-25T23:00:00.000Z');
    expect(await today()).toMatchObject({ date: '2026-10-26' });
    expect(await board()).toMatchObject({ firstPass: { total: 0 }, previous: { total: 3 } });
    expect((await viewer.get('/api/v1/stations').expect(200)).body[0]).toMatchObject({ postsToday: 0 });
  });

  it('begins and ends at midnight of the site on a day of 23 hours', async () => {
    await start('2026-03-29T21:59:59.999Z', { AMPKEEP_TIME_ZONE: 'Europe/Berlin' });
    for (const startedAt of [
      '2026-03-28T22:59:59.999Z',
      '2026-03-28T23:00:00.000Z',
      '2026-03-29T21:59:59.999Z',
    ]) {
      await passed(startedAt);
    }
    expect(await board()).toMatchObject({ firstPass: { total: 2 }, previous: { total: 1 } });
    await at('2026-03-29T22:00:00.000Z');
    expect(await board()).toMatchObject({ firstPass: { total: 0 }, previous: { total: 3 } });
  });

  it('looks back over seven site days, no less and no more', async () => {
    await start('2026-11-30T12:00:00Z', { AMPKEEP_TIME_ZONE: 'Pacific/Auckland' });
    // It is 1 December 01:00 there; seven days before begin on 24 November, 00:00 = 23rd, 11:00 UTC.
    await passed('2026-11-23T10:59:59.999Z');
    await passed('2026-11-23T11:00:00.000Z');
    await passed('2026-11-30T10:59:59.999Z');
    await passed('2026-11-30T11:00:00.000Z');
    expect(await today()).toMatchObject({ date: '2026-12-01' });
    expect(await board()).toMatchObject({ firstPass: { total: 1 }, previous: { total: 2 } });
  });

  it('shows the thirty newest results', async () => {
    await start('2026-11-30T12:00:00Z');
    for (let i = 0; i < 32; i += 1) await test.post(aResult({ serialNumber: `N-${i}` })).expect(201);
    const { recent } = await today();
    expect(recent.map(({ serialNumber }) => serialNumber)).toEqual(
      Array.from({ length: 30 }, (_, i) => `N-${31 - i}`),
    );
  });
});
