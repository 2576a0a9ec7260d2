import type { PostedResult } from '../src/results/result.types.js';
import { connect, type AddressInfo } from 'node:net';
import { gzipSync } from 'node:zlib';
import type TestAgent from 'supertest/lib/agent.js';
import { aResult } from './builders.js';
import { createTestApp, startOfTest, type TestApp } from './create-test-app.js';

describe('a post that cannot be taken', () => {
  let test: TestApp;
  let integrator: TestAgent;
  let key: string;
  beforeAll(async () => {
    test = await createTestApp();
    integrator = await test.as('integrator');
    key = await test.keyFor('north-1');
  });
  afterAll(() => test.close());

  const newestRefused = async () => {
    const { body } = await integrator.get('/api/v1/intake?kind=refused&limit=1').expect(200);
    return body.items[0];
  };
  const postBytes = (bytes: Buffer, headers: Record<string, string> = {}) =>
    test.http
      .post('/api/v1/results')
      .set({ 'X-API-Key': key, 'Content-Type': 'application/json', ...headers })
      .serialize((body) => body as never)
      .send(bytes as never);
  /** Each refusal stands in the intake by its own time. */
  const refuse = async (body: unknown, status: number) => {
    test.clock.now += 1000;
    const answer = await test
      .post(body)
      .expect(status)
      .expect('Content-Type', /^application\/problem\+json/);
    const kept = await newestRefused();
    expect(kept).toMatchObject({ status, lastReceivedAt: new Date(test.clock.now).toISOString() });
    expect(kept.errors).toEqual(answer.body.errors ?? []);
    return answer.body;
  };

  describe('as it is no strict JSON', () => {
    const valid = JSON.stringify(aResult());
    it.each([
      ['nothing at all', '', /not JSON/],
      ['half of it', valid.slice(0, 300), /not JSON/],
      ['a trailing comma', valid.replace(/}$/, ',}'), /not JSON/],
      ['a comment', `${valid}// done`, /not JSON/],
      ['NaN for a number', valid.replace('9.004', 'NaN'), /not JSON/],
      ['single quotes', valid.replaceAll('"', "'"), /not JSON/],
      ['two documents', `${valid}\n${valid}`, /not JSON/],
      ['a leading zero', valid.replace('9.004', '09.004'), /not JSON/],
      ['a raw line break in a text', valid.replace('B117', 'B\n117'), /not JSON/],
      ['twelve levels and one more', `${'['.repeat(13)}${']'.repeat(13)}`, /deeper than 12/],
      ['a tower of brackets', '['.repeat(400_000), /not JSON/],
    ])('for %s', async (_, body, detail) => {
      expect(await refuse(body, 400)).toMatchObject({
        code: 'malformed',
        detail: expect.stringMatching(detail),
      });
    });

    it('and says where reading broke off', async () => {
      const broken = valid.replace('"outputAmps":0.00050167', '"outputAmps":0.0005o167');
      const { errors } = await refuse(broken, 400);
      expect(errors).toEqual([
        { pointer: '/points/2/outputAmps', code: 'json', detail: expect.stringContaining('JSON') },
      ]);
    });

    it('for a name given twice, with the place of each', async () => {
      const twice = valid
        .replace('"loadVolts":1.2,', '"loadVolts":1.2,"loadVolts":1.3,')
        .replace('"lot":', '"lot":"L1","lot":')
        .replace('"operator":', '"\\u006fperator":"B1","operator":');
      const { errors } = await refuse(twice, 400);
      expect(errors.map((error: { pointer: string; code: string }) => [error.code, error.pointer])).toEqual([
        ['duplicateName', '/lot'],
        ['duplicateName', '/operator'],
        ['duplicateName', '/points/1/loadVolts'],
      ]);
    });

    it('for half a surrogate pair, in a text or in a name', async () => {
      const halved = valid.replace('"B117"', '"B\\ud83d7"').replace('"relayCard"', '"relay\\udd29"');
      const { errors } = await refuse(halved, 400);
      expect(errors.map((error: { pointer: string; code: string }) => error.code)).toEqual(['text', 'text']);
      await test.post(valid.replace('"B117"', '"B\\ud83d\\udd29"')).expect(201);
    });

    it('for bytes that are not UTF-8', async () => {
      const latin1 = Buffer.from(valid.replace('B117', 'Bär'), 'latin1');
      const { body } = await postBytes(latin1).expect(400);
      expect(body.detail).toMatch(/not UTF-8/);
      const utf16 = await postBytes(Buffer.from(`\ufeff${valid}`, 'utf16le')).expect(400);
      expect(utf16.body.detail).toMatch(/not UTF-8/);
    });

    it('for what says it is gzip and is not, or broke off', async () => {
      test.clock.now += 1000;
      const gzip = { 'Content-Encoding': 'gzip' };
      await postBytes(Buffer.from(valid), gzip).expect(400);
      const { body } = await postBytes(gzipSync(valid).subarray(0, 200), gzip).expect(400);
      expect(body.detail).toMatch(/can't be unpacked/);
      expect(await newestRefused()).toMatchObject({
        status: 400,
        lastReceivedAt: new Date(test.clock.now).toISOString(),
      });
    });

    it('with errors that stay small, whatever their number and the length of the names', async () => {
      const name = 'n'.repeat(100_000);
      const { errors } = await refuse(`{"${name}":{${'"a":1,'.repeat(80_000)}"a":1}}`, 400);
      expect(errors).toHaveLength(50);
      expect(JSON.stringify(errors).length).toBeLessThan(20_000);
      const { body } = await test.post(`{"${name}":1,${JSON.stringify(aResult()).slice(1)}`).expect(422);
      expect(JSON.stringify(body).length).toBeLessThan(1000);
    });

    it('and a body that breaks off on the way leaves nothing behind', async () => {
      const { port } = test.app.getHttpServer().address() as AddressInfo;
      const unit = 'BROKEN-OFF';
      const text = JSON.stringify(aResult({ serialNumber: unit }));
      const socket = connect(port, '127.0.0.1');
      const answered = new Promise<string>((resolve) => {
        let answer = '';
        socket.on('data', (data) => (answer += data.toString()));
        socket.on('close', () => resolve(answer));
      });
      socket.end(
        `POST /api/v1/results HTTP/1.1\r\nHost: localhost\r\nX-API-Key: ${key}\r\nContent-Type: application/json\r\n` +
          `Content-Length: ${text.length + 1}\r\n\r\n${text}`,
      );
      expect(await answered).toMatch(/^(HTTP\/1\.1 400 .*|)/);
      await integrator.get(`/api/v1/units/FH-R500-W/${unit}`).expect(404);
    });
  });

  describe('as it is against the contract', () => {
    const placesOf = async (body: object) =>
      Object.fromEntries(
        (await refuse(body, 422)).errors.map((error: { pointer: string; detail: string }) => [
          error.pointer,
          error.detail,
        ]),
      );

    it('names every place, and what was meant by a misspelt name', async () => {
      const { serialNumber, points, ...rest } = aResult();
      const places = await placesOf({
        ...rest,
        serialnumber: serialNumber,
        ambientCelcius: 23,
        points: [{ loadVolt: 0, outputAmps: '0.0005' }, ...points],
        ammeter: { rangeAmps: -1, colour: 'red' },
        'a/b~c': 1,
      });
      expect(places).toMatchObject({
        '/serialNumber': '"serialNumber" is missing.',
        '/serialnumber': expect.stringContaining('did you mean "serialNumber"?'),
        '/ambientCelcius': expect.stringContaining('did you mean "ambientCelsius"?'),
        '/points/0/loadVolts': expect.stringContaining('missing'),
        '/points/0/loadVolt': expect.stringContaining('did you mean "loadVolts"?'),
        '/points/0/outputAmps': expect.stringContaining('number'),
        '/ammeter/rangeAmps': expect.any(String),
        '/ammeter/colour': expect.stringMatching(/no property.*"extra"/),
        '/a~1b~0c': expect.any(String),
      });
      expect(places['/ammeter/colour']).not.toContain('did you mean');
    });

    it.each([
      ['an unknown part number', { partNumber: 'FH-R500-X' }, '/partNumber', /"FH-R500-X" is no product/],
      ['a part number in other case', { partNumber: 'fh-r500-w' }, '/partNumber', /no product/],
      ['an unknown stage', { stage: 'burn-in' }, '/stage', /its stages are: board, final/],
      [
        'two points of a completed run',
        {
          points: [
            { loadVolts: 0, outputAmps: 0 },
            { loadVolts: 1, outputAmps: 0 },
          ],
        },
        '/points',
        /3/,
      ],
      [
        '501 points',
        { points: Array.from({ length: 501 }, () => ({ loadVolts: 0, outputAmps: 0 })) },
        '/points',
        /500/,
      ],
      ['an abort without its reason', { outcome: 'aborted' }, '/abortReason', /missing/],
      ['a study without its place', { runKind: 'study' }, '/study', /missing/],
      ['an id that is no UUID', { resultId: '17' }, '/resultId', /UUID/],
      [
        'an id with a prefix',
        { resultId: 'urn:uuid:0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11' },
        '/resultId',
        /UUID/,
      ],
      ['a time without zone', { startedAt: '2026-11-30T08:15:30' }, '/startedAt', /RFC 3339/],
      ['a day that does not exist', { startedAt: '2026-02-30T08:15:30Z' }, '/startedAt', /RFC 3339/],
      ['a leap second', { finishedAt: '2016-12-31T23:59:60Z' }, '/finishedAt', /leap second/],
      ['an empty serial number', { serialNumber: '' }, '/serialNumber', /./],
      ['a serial number with a line break', { serialNumber: 'W\n1' }, '/serialNumber', /control/],
      ['a serial number that begins with a space', { serialNumber: ' W1' }, '/serialNumber', /space/],
      ['a serial number that is a step up', { serialNumber: '..' }, '/serialNumber', /"\.\."/],
      ['a serial number of 65 characters', { serialNumber: 'x'.repeat(65) }, '/serialNumber', /64/],
      ['a number as serial number', { serialNumber: 17 as never }, '/serialNumber', /string/],
      ['a text as supply', { supplyVolts: '9' as never }, '/supplyVolts', /number/],
      ["nested values of one's own", { extra: { a: [1] as never } }, '/extra/a', /./],
      ["an odd name of one's own", { extra: { ' a': 1 } }, '/extra/ a', /space/],
      [
        "21 values of one's own",
        { extra: Object.fromEntries(Array.from({ length: 21 }, (_, i) => [`k${i}`, i])) },
        '/extra',
        /20/,
      ],
      ['null for what was not measured', { ambientCelsius: null as never }, '/ambientCelsius', /number/],
    ])('for %s', async (_, overrides, pointer, detail) => {
      const places = await placesOf(aResult(overrides as Partial<PostedResult>));
      expect(places).toEqual(expect.objectContaining({ [pointer]: expect.stringMatching(detail) }));
      expect(Object.keys(places).every((place) => place.startsWith(pointer))).toBe(true);
    });

    it.each([
      ['an array', []],
      ['null', null],
      ['a number', 17],
      ['a text', '"post"'],
      ['an empty object', {}],
    ])('for %s instead of a result', async (_, body) => {
      expect((await refuse(body, 422)).errors.length).toBeGreaterThan(0);
    });

    it('for a start more than five minutes ahead, and tells the time', async () => {
      const ahead = (ms: number): string => new Date(test.clock.now + 1000 + ms).toISOString();
      const places = await placesOf(aResult({ startedAt: ahead(5 * 60_000 + 1) }));
      expect(places).toEqual({ '/startedAt': expect.stringContaining('Set the station') });
      await test.post(aResult({ serialNumber: 'AHEAD', startedAt: ahead(5 * 60_000 - 1000) })).expect(201);
      expect(test.clock.now).toBeGreaterThan(startOfTest);
    });

    it('for numbers that no number can hold', async () => {
      const text = JSON.stringify(aResult()).replace('9.004', '1e999');
      expect((await refuse(text, 422)).errors[0].pointer).toBe('/supplyVolts');
    });
  });
});
