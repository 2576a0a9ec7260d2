import { randomUUID } from 'node:crypto';
import type TestAgent from 'supertest/lib/agent.js';
import { aFailingResult, aResult } from './builders.js';
import { createTestApp, type TestApp } from './create-test-app.js';

/** FH-R500-W over four days; the clock stands at noon of 30 November, UTC. */
describe('GET /api/v1/yields', () => {
  let test: TestApp;
  let engineer: TestAgent;

  const at = (day: number, hour = 8): string => new Date(Date.UTC(2026, 10, day, hour)).toISOString();
  const on = (day: number, serialNumber: string, hour?: number) => ({
    resultId: randomUUID(),
    serialNumber,
    startedAt: at(day, hour),
  });

  beforeAll(async () => {
    test = await createTestApp();
    engineer = await test.as('productionEngineer');
    const posts = [
      aResult({ ...on(27, 'U1'), lot: 'L1', fixture: '1' }),
      aFailingResult({ ...on(27, 'U2'), lot: 'L1', fixture: '2' }),
      aResult({ ...on(28, 'U2'), lot: 'L1', fixture: '1' }),
      aFailingResult({ ...on(29, 'U3'), lot: 'L2', fixture: '2', program: { name: 'fh', version: '3.5.0' } }),
      aResult({ ...on(29, 'U4'), lot: 'L2', fixture: '1' }),
      aResult({ ...on(29, 'U4', 10), stage: 'final', lot: 'L2', fixture: '1' }),
      aResult({ ...on(29, 'U5'), outcome: 'aborted', abortReason: 'door opened', points: [] }),
      aResult({ ...on(29, 'GOLD-1'), runKind: 'golden' }),
    ];
    // The newest first: order of arrival must not matter.
    for (const post of posts.reverse()) await test.post(post).expect(201);
  });
  afterAll(() => test.close());

  const report = async (query: Record<string, string> = {}) =>
    (
      await engineer
        .get('/api/v1/yields')
        .query({ from: '2026-11-27', to: '2026-11-30', ...query })
        .expect(200)
    ).body;

  it('counts each unit and stage once, on the day of its first attempt', async () => {
    const { buckets } = await report();
    expect(
      buckets.map((bucket: { firstPass: { passed: number; total: number } }) => [
        bucket.firstPass.passed,
        bucket.firstPass.total,
      ]),
    ).toEqual([
      [1, 2],
      [0, 0],
      [2, 3],
      [0, 0],
    ]);
  });

  it('lets a later pass count for the final yield of the day of the first attempt', async () => {
    const { buckets, whole, retests } = await report();
    expect(buckets[0].final).toMatchObject({ passed: 2, total: 2 });
    expect(whole).toMatchObject({ failed: 2, notProven: 0, openUnits: 1 });
    expect(retests).toEqual({ retested: 1, total: 5, passedOnSecond: 1 });
  });

  it('splits by the attributes of the first attempt', async () => {
    const { groups } = await report({ split: 'fixture' });
    expect(
      groups.map((group: { name: string; firstPass: { passed: number; total: number } }) => [
        group.name,
        group.firstPass.passed,
        group.firstPass.total,
      ]),
    ).toEqual([
      ['1', 3, 3],
      ['2', 0, 2],
    ]);
  });

  it('filters, ranks failing measures and counts aborts', async () => {
    const { whole, failingMeasures, aborts } = await report({ lot: 'L2', stage: 'board' });
    expect(whole.firstPass).toMatchObject({ passed: 1, total: 2 });
    expect(failingMeasures).toEqual([
      { measure: 'outputImpedance', label: 'Output impedance', units: 1, cumulativeShare: 1 },
    ]);
    expect((await report()).aborts).toEqual({ aborted: 1, total: 7 });
    expect(aborts).toEqual({ aborted: 0, total: 2 });
  });

  it('rolls the yields of all stages of one product', async () => {
    expect((await report()).rolledThroughput).toBeNull();
    expect((await report({ partNumber: 'FH-R500-W' })).rolledThroughput.share).toBeCloseTo(0.5, 12);
  });

  it('marks where a program version ran for the first time', async () => {
    const { markers } = await report();
    expect(markers).toEqual([{ at: at(29), kind: 'program', text: 'FH-R500-W board: fh 3.5.0' }]);
  });

  it('names what is wrong with a period', async () => {
    const { body } = await engineer
      .get('/api/v1/yields')
      .query({ from: '2026-11-31', to: '2026-12-01' })
      .expect(422);
    expect(body.errors[0].pointer).toBe('/from');
  });
});
