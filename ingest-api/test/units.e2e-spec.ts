import { randomUUID } from 'node:crypto';
import type TestAgent from 'supertest/lib/agent.js';
import { aFailingResult, aResult } from './builders.js';
import { createTestApp, type TestApp } from './create-test-app.js';

interface Item {
  serialNumber: string;
  asked: { stage: string; verdict: string };
}

/** U1 fails board on the 27th and passes it a day later; U2 passes board and final on the 28th. */
describe('GET /api/v1/units', () => {
  let test: TestApp;
  let engineer: TestAgent;

  const on = (day: number, serialNumber: string, hour = 8) => ({
    resultId: randomUUID(),
    serialNumber,
    startedAt: new Date(Date.UTC(2026, 10, day, hour)).toISOString(),
  });

  beforeAll(async () => {
    test = await createTestApp();
    engineer = await test.as('productionEngineer');
    const posts = [
      aFailingResult({ ...on(27, 'U1'), fixture: '2' }),
      aResult({ ...on(28, 'U1'), fixture: '1' }),
      aResult({ ...on(28, 'U2'), fixture: '1' }),
      aResult({ ...on(28, 'U2', 10), stage: 'final', fixture: '1' }),
    ];
    for (const post of posts) await test.post(post).expect(201);
  });
  afterAll(() => test.close());

  const list = async (query: Record<string, string>): Promise<Item[]> =>
    (await engineer.get('/api/v1/units').query(query).expect(200)).body.items;
  const serials = async (query: Record<string, string>) =>
    (await list(query)).map(({ serialNumber }) => serialNumber);

  it('filters by the days on which the latest result started', async () => {
    expect(await serials({ from: '2026-11-28', to: '2026-11-28' })).toEqual(['U2', 'U1']);
    expect(await serials({ to: '2026-11-27' })).toEqual([]);
    expect(await serials({ from: '2026-11-29' })).toEqual([]);
  });

  it('finds a unit by its first attempt, though it passed since', async () => {
    const query = { of: 'firstAttempt', from: '2026-11-27', to: '2026-11-27', verdict: 'fail', fixture: '2' };
    const found = await list(query);
    expect(found).toMatchObject([{ serialNumber: 'U1', asked: { verdict: 'fail' } }]);
    expect(await serials({ ...query, of: 'latest' })).toEqual([]);
  });

  it('lists a unit once, whatever the number of stages it was tested at', async () => {
    expect(await serials({ of: 'firstAttempt' })).toEqual(['U2', 'U1']);
    expect(await list({ of: 'firstAttempt', stage: 'board', search: 'U2' })).toMatchObject([
      { asked: { stage: 'board' } },
    ]);
  });

  it('finds the units that failed a measure', async () => {
    const failed = { failedMeasure: 'outputImpedance' };
    expect(await serials({ of: 'firstAttempt', ...failed })).toEqual(['U1']);
    expect(await serials(failed)).toEqual([]);
  });

  it('pages through first attempts without loss or repetition', async () => {
    const first = await engineer.get('/api/v1/units').query({ of: 'firstAttempt', limit: 1 }).expect(200);
    const cursor: string = first.body.nextCursor;
    expect(await serials({ of: 'firstAttempt', limit: '1', cursor })).toEqual(['U1']);
  });

  it('names a day that does not exist', async () => {
    const { body } = await engineer.get('/api/v1/units').query({ from: '2026-02-30' }).expect(422);
    expect(body.errors[0].pointer).toBe('/from');
  });
});
