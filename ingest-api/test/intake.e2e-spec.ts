import { randomBytes } from 'node:crypto';
import type TestAgent from 'supertest/lib/agent.js';
import type { IntakeItemDto, IntakePageDto } from '../src/intake/dto/intake.dto.js';
import { aFailingResult, aResult } from './builders.js';
import { createTestApp, startOfTest, type TestApp } from './create-test-app.js';

describe('the intake', () => {
  let test: TestApp;
  let integrator: TestAgent;
  const start = async (settings: Record<string, string> = {}) => {
    test = await createTestApp(settings);
    integrator = await test.as('integrator');
  };
  afterEach(() => test.close());
  const page = async (query = ''): Promise<IntakePageDto> =>
    (await integrator.get(`/api/v1/intake?${query}`).expect(200)).body;
  const refused = async (intakeId: string) =>
    (await integrator.get(`/api/v1/intake/refused/${intakeId}`).expect(200)).body;
  const tick = (): number => (test.clock.now += 1000);

  it('shows what was accepted and what was refused, newest first', async () => {
    await start();
    const post = aFailingResult({ serialNumber: 'I-1' });
    await test.post(post).expect(201);
    tick();
    await test.post({ ...post, stage: 'nowhere' }).expect(422);
    tick();
    await test.post('{"half').expect(400);
    const { items, nextCursor } = await page();
    expect(nextCursor).toBeNull();
    const common = { count: 1, station: 'north-1' };
    const named = { resultId: post.resultId, partNumber: 'FH-R500-W', serialNumber: 'I-1' };
    expect(items).toEqual([
      expect.objectContaining({ ...common, kind: 'refused', status: 400, resultId: null, verdict: null }),
      expect.objectContaining({ ...common, ...named, kind: 'refused', status: 422 }),
      expect.objectContaining({
        ...common,
        ...named,
        kind: 'accepted',
        status: 201,
        verdict: 'fail',
        errors: [],
      }),
    ]);
    expect(items[1]!.errors).toEqual([expect.objectContaining({ pointer: '/stage', code: 'unknownStage' })]);
    expect((await page('kind=accepted')).items).toEqual([items[2]]);
    expect((await page('kind=refused')).items).toEqual([items[0], items[1]]);
    expect((await page('station=north-2')).items).toEqual([]);
  });

  it('keeps a refused post as it came, with its reasons', async () => {
    await start();
    const text = '{"partNumber":"<b>FH</b>",\n\t"serialNumber":"Ω 測 🔩","notes":"nul \\u0000 here"}';
    await test.post(text).expect(422);
    const [item] = (await page()).items;
    const kept = await refused(item!.intakeId);
    expect(kept).toMatchObject({
      ...item,
      title: 'The content is not valid',
      detail: expect.stringContaining('mending'),
      body: text,
      bodyBytes: Buffer.byteLength(text),
      bodyTruncated: false,
    });
    expect(kept.partNumber).toBe('<b>FH</b>');
  });

  it('counts the same body up instead of keeping it again, station by station', async () => {
    await start();
    const other = await test.keyFor('north-2');
    await test.post('{"a":1}').expect(422);
    const last = tick();
    await test.post('{"a":1}').expect(422);
    await test.post('{"a":1}', other).expect(422);
    await test.post('{"a":2}').expect(422);
    const { items } = await page();
    expect(items.map(({ station, count }) => `${station} ${count}`).sort()).toEqual([
      'north-1 1',
      'north-1 2',
      'north-2 1',
    ]);
    expect(items.find(({ count }) => count === 2)).toMatchObject({
      receivedAt: new Date(startOfTest).toISOString(),
      lastReceivedAt: new Date(last).toISOString(),
    });
  });

  it('keeps conflicts, under the station that sent them', async () => {
    await start();
    const post = aResult({ serialNumber: 'I-2' });
    await test.post(post).expect(201);
    await test.post({ ...post, serialNumber: 'I-3' }, await test.keyFor('north-2')).expect(409);
    const [item] = (await page('kind=refused')).items;
    expect(item).toMatchObject({
      station: 'north-2',
      status: 409,
      serialNumber: 'I-3',
      resultId: post.resultId,
    });
  });

  it('cuts a long body off', async () => {
    await start();
    const text = JSON.stringify({ notes: '測'.repeat(200_000) });
    await test.post(text).expect(422);
    const kept = await refused((await page()).items[0]!.intakeId);
    expect(kept).toMatchObject({ bodyTruncated: true, bodyBytes: Buffer.byteLength(text) });
    expect(kept.body.length).toBeLessThan(100_000);
    expect(kept.body.slice(0, 50_000)).toBe(text.slice(0, 50_000));
  });

  it('makes room for new refused posts by letting the oldest go, and never touches results', async () => {
    await start({ AMPKEEP_REFUSED_QUOTA_MB: '1' });
    await test.post(aResult({ serialNumber: 'I-4' })).expect(201);
    const bodies = Array.from(
      { length: 9 },
      (_, i) => `{"n":${i},"x":"${randomBytes(150_000).toString('base64')}"}`,
    );
    for (const body of bodies) {
      tick();
      await test.post(body).expect(422);
    }
    const { items } = await page('kind=refused');
    expect(items.length).toBeGreaterThanOrEqual(4);
    expect(items.length).toBeLessThanOrEqual(7);
    const numbers = await Promise.all(
      items.map(async ({ intakeId }) => (await refused(intakeId)).body.slice(5, 6)),
    );
    expect(numbers).toEqual(['8', '7', '6', '5', '4', '3', '2'].slice(0, items.length));
    expect((await page('kind=accepted')).items).toHaveLength(1);
  });

  it('counts the reasons of small posts against the room, too', async () => {
    await start({ AMPKEEP_REFUSED_QUOTA_MB: '1' });
    const wrong = Object.fromEntries(
      Array.from({ length: 50 }, (_, i) => [`misspelt-${'x'.repeat(45)}-${i}`, 1]),
    );
    for (let n = 0; n < 120; n += 1) await test.post({ ...wrong, n }).expect(422);
    const { items } = await page('kind=refused&limit=200');
    const bytes = items.reduce((sum, item) => sum + JSON.stringify(item.errors).length, 0);
    expect(items.length).toBeLessThan(120);
    expect(bytes).toBeGreaterThan(500_000);
    expect(bytes).toBeLessThan(1_000_000);
  });

  it('is read page by page without loss or repetition, whatever the page size', async () => {
    await start();
    for (let i = 0; i < 12; i += 1) {
      // Several at one instant, so that time alone can't order them.
      if (i % 4 === 0) tick();
      if (i % 3 === 0) await test.post(`{"n":${i}}`).expect(422);
      else await test.post(aResult({ serialNumber: `I-${i}` })).expect(201);
    }
    const whole = (await page('limit=200')).items;
    expect(whole).toHaveLength(12);
    for (const limit of [1, 5, 12]) {
      for (const kind of ['all', 'accepted', 'refused']) {
        const read: IntakeItemDto[] = [];
        let cursor: string | null = '';
        while (cursor !== null) {
          const next: IntakePageDto = await page(`limit=${limit}&kind=${kind}&cursor=${cursor}`);
          expect(next.items.length).toBeLessThanOrEqual(limit);
          read.push(...next.items);
          cursor = next.nextCursor;
        }
        expect(read).toEqual(whole.filter((item) => kind === 'all' || item.kind === kind));
      }
    }
  });

  it.each(['x0', 'x99', 'r1', '1', 'x-1', 'x1;--', `x${'9'.repeat(30)}`, '%00', '..%2f', 'x1%0a'])(
    'has no refused post %s',
    async (intakeId) => {
      await start();
      await integrator.get(`/api/v1/intake/refused/${intakeId}`).expect(404);
    },
  );
});
