import type TestAgent from 'supertest/lib/agent.js';
import type { ResultPageDto } from '../src/results/dto/result-page.dto.js';
import type { PostedResult } from '../src/results/result.types.js';
import { aFailingResult, aResult } from './builders.js';
import { createTestApp, type TestApp } from './create-test-app.js';

describe('reading results', () => {
  let test: TestApp;
  let viewer: TestAgent;
  const posts: PostedResult[] = [
    aResult({ serialNumber: 'W-1', lot: 'L1' }),
    aFailingResult({ serialNumber: 'W-2', lot: 'L1' }),
    aResult({ serialNumber: 'W-2', lot: 'L2', stage: 'final' }),
    aResult({ serialNumber: 'W-3', runKind: 'practice' }),
    aResult({ serialNumber: 'W-4', outcome: 'aborted', abortReason: 'door' }),
  ];
  beforeAll(async () => {
    test = await createTestApp();
    viewer = await test.as('viewer');
    for (const post of posts.slice(0, 4)) await test.post(post).expect(201);
    await test.post(posts[4], await test.keyFor('north-2')).expect(201);
  });
  afterAll(() => test.close());
  const page = async (query: string): Promise<ResultPageDto> =>
    (await viewer.get(`/api/v1/results?${query}`).expect(200)).body;
  const serials = async (query: string) => (await page(query)).items.map(({ serialNumber }) => serialNumber);

  it('lists them by arrival, the newest first, page by page', async () => {
    const whole = (await page('')).items;
    expect(whole.map(({ resultId }) => resultId)).toEqual(posts.map(({ resultId }) => resultId).reverse());
    for (const limit of [1, 2, 5]) {
      const read = [];
      let cursor: string | null = '';
      while (cursor !== null) {
        const next: ResultPageDto = await page(`limit=${limit}&cursor=${cursor}`);
        read.push(...next.items);
        cursor = next.nextCursor;
      }
      expect(read).toEqual(whole);
    }
  });

  it.each([
    ['partNumber=FH-R500-W', ['W-4', 'W-3', 'W-2', 'W-2', 'W-1']],
    ['partNumber=FH-R500', []],
    ['serialNumber=W-2', ['W-2', 'W-2']],
    ['serialNumber=W-%25', []],
    ['serialNumber=W-2&stage=final', ['W-2']],
    ['station=north-2', ['W-4']],
    ['lot=L1', ['W-2', 'W-1']],
    ['verdict=fail', ['W-2']],
    ['verdict=aborted', ['W-4']],
    ['runKind=practice', ['W-3']],
    ["lot=L1' OR '1'='1", []],
  ])('finds by %s', async (query, found) => {
    expect(await serials(encodeURI(query).replaceAll('%2525', '%25'))).toEqual(found);
  });

  it('gives the post back exactly as it was received, byte by byte', async () => {
    const text = `\ufeff \n${JSON.stringify(aResult({ serialNumber: 'RAW', notes: '<script>alert(1)</script> Ω' }), null, 3)}\t`;
    const { body } = await test.post(text).expect(201);
    const cookieless = await test.http.get(`${body.links.self}/post`).expect(401);
    expect(cookieless.text).not.toContain('RAW');
    const raw = await viewer
      .get(`${body.links.self}/post`)
      .buffer(true)
      .parse((response, done) => {
        const chunks: Buffer[] = [];
        response.on('data', (chunk: Buffer) => chunks.push(chunk));
        response.on('end', () => {
          // What the documented check looks at is the text behind the byte order mark.
          (response as unknown as { text: string }).text = Buffer.concat(chunks).toString().slice(1);
          done(null, Buffer.concat(chunks));
        });
      })
      .expect(200);
    expect((raw.body as Buffer).equals(Buffer.from(text))).toBe(true);
    expect(raw.headers['content-type']).toMatch(/^application\/json/);
    expect(raw.headers['x-content-type-options']).toBe('nosniff');
    const detail = await viewer.get(body.links.self).expect(200);
    expect(detail.body.notes).toBe('<script>alert(1)</script> Ω');
  });

  it('tells all about one, with the judging in words and the sweep to draw', async () => {
    const { body } = await viewer.get(`/api/v1/results/${posts[1]!.resultId}`).expect(200);
    expect(body).toMatchObject({
      resultId: posts[1]!.resultId,
      programName: 'fh-final',
      stationVerdict: 'fail',
      routedOn: 'hub',
      verdict: 'fail',
      disposition: 'retest',
      attemptsLeft: 2,
    });
    const impedance = body.measures.find((measure: { name: string }) => measure.name === 'outputImpedance');
    expect(impedance).toMatchObject({ outcome: 'fail', label: 'Output impedance', limit: { lower: 5e6 } });
    expect(impedance.sentence).toMatch(/1(\.0+)? MΩ/);
    expect(body.sweep.points).toHaveLength(9);
    expect(body.sweep.limitLine).toHaveLength(2);
    expect(body.sweep.line.length).toBeGreaterThan(1);
  });

  it.each([
    ['an id that was never used', '0193f3a2-0000-7c52-9a3e-5b1f4c0d2e11'],
    ['no id', 'x'],
    ['a wildcard', '%25'],
    ['a NUL', '%00'],
    ['a long text', 'x'.repeat(5000)],
    ['a quote', "'%20OR%201=1--"],
  ])('finds nothing under %s', async (_, id) => {
    const missing = await viewer.get(`/api/v1/results/${id}`).expect(404);
    expect(missing.body.detail.length).toBeLessThan(200);
    await viewer.get(`/api/v1/results/${id}/post`).expect(404);
  });

  const lists = [
    'results',
    'units',
    'intake',
    'breaches',
    'audit',
    'today',
    'stations',
    'products',
    'rights',
  ];
  const queries = [
    'limit=0',
    'limit=201',
    'limit=-1',
    'limit=1.5',
    'limit=abc',
    'limit=',
    'limit=1&limit=2',
    'limit=1e999',
    'cursor=x',
    'cursor=-1',
    'cursor=0',
    'cursor=1.5',
    'cursor=99999999999999999999',
    'cursor=1-1-1;--',
    'cursor=1-9-1',
    `cursor=${'9'.repeat(39)}`,
    'cursor=%00',
    'verdict=none',
    'verdict[]=pass',
    'verdict[$ne]=pass',
    'station=%00',
    'station=a&station=b',
    'search=%00%01',
    'search=%E0%A4%A',
    'search=%F0%9F%94%A9',
    `search=${'x'.repeat(65)}`,
    `partNumber=${'%F0%9F%94%A9'.repeat(64)}`,
    '__proto__=1',
    '__proto__[limit]=1',
    'constructor=1',
    'constructor[prototype][limit]=1',
    'toString=1',
    'hasOwnProperty=1',
    'length=1',
    '=1',
    '&&&',
    '?',
    'order=id;DROP TABLE results',
    `x=${'a'.repeat(10_000)}`,
  ];
  it.each(lists)('answers %s in words, whatever stands behind the question mark', async (list) => {
    const administrator = await test.as('administrator');
    for (const query of queries) {
      const answer = await administrator.get(`/api/v1/${list}?${query.replaceAll(' ', '%20')}`);
      expect([query.slice(0, 60), [200, 400, 422].includes(answer.status)]).toEqual([
        query.slice(0, 60),
        true,
      ]);
    }
    await administrator.get('/api/v1/results').expect(200);
  });

  it.each([
    '/api/v1/units/%E0%A4%A/x',
    '/api/v1/results/%',
    '/api/v1/stations/%ff/keys',
    '/api/v1/%00',
    '/api/v1//results',
  ])('answers %s in words', async (path) => {
    const { status, type } = await viewer.get(path);
    expect([400, 401, 403, 404]).toContain(status);
    expect(type).toBe('application/problem+json');
  });
});
