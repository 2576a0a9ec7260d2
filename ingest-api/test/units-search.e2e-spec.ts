import type TestAgent from 'supertest/lib/agent.js';
import type { UnitItemDto, UnitPageDto } from '../src/units/dto/unit.dto.js';
import { SiteSetupService } from '../src/site-setup/site-setup.service.js';
import { aFailingResult, aProduct, aResult } from './builders.js';
import { createTestApp, type TestApp } from './create-test-app.js';

const odd = [
  '100%',
  '100_',
  '10\\',
  '<img src=x onerror=alert(1)>',
  'a/b?c#d',
  "O'Neil",
  'Ω-7',
  'ünit',
  'x y',
  '%2F',
  '+',
  '~1',
];

const later = { startedAt: '2026-11-30T09:00:00.000Z', finishedAt: undefined };

describe('looking for units', () => {
  let test: TestApp;
  let viewer: TestAgent;
  beforeAll(async () => {
    test = await createTestApp();
    viewer = await test.as('viewer');
    await test.app
      .get(SiteSetupService, { strict: false })
      .apply({ products: [aProduct({ partNumber: 'FH/T250 <C>' })], stations: [] }, 'test');
    for (const serialNumber of ['1000', '100A', '100a', '1001', ...odd]) {
      await test.post(aResult({ serialNumber, lot: `L ${serialNumber}` })).expect(201);
    }
    await test
      .post(aFailingResult({ serialNumber: '1000', stage: 'final', ...later }), await test.keyFor('north-2'))
      .expect(201);
    await test.post(aResult({ partNumber: 'FH/T250 <C>', serialNumber: '1001' })).expect(201);
  });
  afterAll(() => test.close());
  const page = async (query: Record<string, string>): Promise<UnitPageDto> =>
    (await viewer.get('/api/v1/units').query(query).expect(200)).body;
  const serials = async (query: Record<string, string>): Promise<string[]> =>
    (await page(query)).items.map(({ serialNumber }) => serialNumber);

  it('finds by the beginning of a serial number, in any case', async () => {
    expect((await serials({ search: '100' })).sort()).toEqual([
      '100%',
      '1000',
      '1001',
      '1001',
      '100A',
      '100_',
      '100a',
    ]);
    expect((await serials({ search: '100a' })).sort()).toEqual(['100A', '100a']);
    expect(await serials({ search: '00' })).toEqual([]);
  });

  it('takes what is a wildcard elsewhere as the letter it is', async () => {
    expect(await serials({ search: '100%' })).toEqual(['100%']);
    expect(await serials({ search: '100_' })).toEqual(['100_']);
    expect(await serials({ search: '10\\' })).toEqual(['10\\']);
    expect(await serials({ search: '%' })).toEqual(['%2F']);
    expect(await serials({ search: '_' })).toEqual([]);
    expect(await serials({ search: "' OR 1=1 --" })).toEqual([]);
  });

  it.each(odd)('finds %s by its whole name, in the list and by its own address', async (serialNumber) => {
    expect(await serials({ search: serialNumber })).toEqual([serialNumber]);
    const address = `/api/v1/units/FH-R500-W/${encodeURIComponent(serialNumber)}`;
    const { body, headers } = await viewer.get(address).expect(200);
    expect(body).toMatchObject({ partNumber: 'FH-R500-W', serialNumber, lot: `L ${serialNumber}` });
    expect(headers['content-type']).toMatch(/^application\/json/);
    expect(await serials({ lot: `L ${serialNumber}` })).toEqual([serialNumber]);
  });

  it('tells products of the same serial number apart, whatever their names hold', async () => {
    const part = 'FH/T250 <C>';
    const { body } = await viewer.get(`/api/v1/units/${encodeURIComponent(part)}/1001`).expect(200);
    expect(body.partNumber).toBe(part);
    expect((await page({ partNumber: part })).items).toHaveLength(1);
    await viewer.get(`/api/v1/units/${encodeURIComponent(part)}/1000`).expect(404);
  });

  it('goes by the latest result of a unit', async () => {
    expect(await serials({ station: 'north-2' })).toEqual(['1000']);
    expect(await serials({ verdict: 'fail' })).toEqual(['1000']);
    expect(await serials({ stage: 'final' })).toEqual(['1000']);
    const [unit] = (await page({ search: '1000' })).items;
    expect(unit).toMatchObject({
      lot: 'L2648-2',
      latest: { stage: 'final', verdict: 'fail' },
      stages: [
        { stage: 'board', attempts: 1, verdict: 'pass' },
        { stage: 'final', attempts: 1, verdict: 'fail' },
      ],
    });
  });

  it('gives every unit once, page by page, whatever the size of a page', async () => {
    const whole = (await page({ limit: '200' })).items;
    expect(whole).toHaveLength(17);
    for (const limit of [1, 3, 16, 17]) {
      const read: UnitItemDto[] = [];
      let cursor: string | null = '';
      while (cursor !== null) {
        const next: UnitPageDto = await page({ limit: String(limit), cursor });
        read.push(...next.items);
        cursor = next.nextCursor;
      }
      expect(read).toEqual(whole);
    }
  });

  it('shows a unit tested again while someone turns the pages once at most on the pages to come', async () => {
    const first = await page({ limit: '5' });
    const late = (await page({ limit: '200' })).items.at(-1)!;
    await test
      .post(aResult({ serialNumber: late.serialNumber, lot: undefined, stage: 'final', ...later }))
      .expect(201);
    const rest = await page({ limit: '200', cursor: first.nextCursor! });
    const seen = [...first.items, ...rest.items].map(
      ({ serialNumber, partNumber }) => `${partNumber} ${serialNumber}`,
    );
    expect(new Set(seen).size).toBe(seen.length);
    expect((await page({ limit: '1' })).items[0]!.serialNumber).toBe(late.serialNumber);
  });
});
