import { gzipSync } from 'node:zlib';
import request from 'supertest';
import { Writer } from '../src/database/writer.js';
import { StationRegister } from '../src/stations/station-register.service.js';
import { Station } from '../src/stations/models/station.model.js';
import { aResult } from './builders.js';
import { createTestApp, startOfTest, type TestApp } from './create-test-app.js';

describe('posting a result', () => {
  let test: TestApp;
  let otherKey: string;
  beforeAll(async () => {
    test = await createTestApp();
    otherKey = await test.keyFor('north-2');
  });
  afterAll(() => test.close());
  const refusedCount = async (): Promise<number> => {
    const integrator = await test.as('integrator');
    const { body } = await integrator.get('/api/v1/intake?kind=refused&limit=200').expect(200);
    return body.items.length;
  };

  it('is answered 201 with all that the station needs, and the result can be read at once', async () => {
    const post = aResult({ serialNumber: 'A-1' });
    const { body } = await test.post(post).expect(201);
    expect(body).toMatchObject({
      resultId: post.resultId,
      receivedAt: new Date(startOfTest).toISOString(),
      verdict: 'pass',
      attempt: 1,
      disposition: 'next',
      nextStage: 'final',
      attemptsLeft: 2,
      priorStagePassed: null,
      lotHeld: false,
      testPlanVersion: 1,
      limitSetVersion: 1,
      failedMeasures: [],
      links: { self: `/api/v1/results/${post.resultId}`, unit: '/units/FH-R500-W/A-1' },
    });
    const viewer = await test.as('viewer');
    const { body: detail } = await viewer.get(body.links.self).expect(200);
    expect(detail).toMatchObject({ resultId: post.resultId, verdict: 'pass', operator: 'B117' });
  });

  describe('a second time', () => {
    it('gives the first answer again, however differently the same content is written', async () => {
      const post = aResult({ serialNumber: 'A-2' });
      const first = await test.post(post).expect(201);
      test.clock.now += 60_000;
      const reordered = Object.fromEntries(Object.entries(post).reverse());
      const rewritten = [
        JSON.stringify(post),
        JSON.stringify(reordered, null, 4),
        JSON.stringify(post).replaceAll('0.00050188', '5.0188e-4').replace('9.004', '9.00400'),
        JSON.stringify(post).replace('"A-2"', '"\\u0041-2"'),
        `\ufeff\r\n\t ${JSON.stringify(post)} \n`,
      ];
      for (const text of rewritten) {
        const again = await test.post(text).expect(200);
        expect(again.body).toEqual(first.body);
      }
      test.clock.now = startOfTest;
    });

    it('is a conflict when the content differs, and what is stored stays as it was', async () => {
      const post = aResult({ serialNumber: 'A-3' });
      await test.post(post).expect(201);
      const refused = await test.post({ ...post, serialNumber: 'A-4' }).expect(409);
      expect(refused.body).toMatchObject({
        code: 'result_id_used',
        errors: [{ pointer: '/resultId', code: 'resultIdUsed' }],
      });
      const viewer = await test.as('viewer');
      const { body } = await viewer.get(`/api/v1/results/${post.resultId}`).expect(200);
      expect(body.serialNumber).toBe('A-3');
      await viewer.get('/api/v1/units/FH-R500-W/A-4').expect(404);
    });

    it("is a conflict for another station's key, which learns nothing of the content", async () => {
      const post = aResult({ serialNumber: 'A-SECRET', lot: 'L-SECRET' });
      await test.post(post).expect(201);
      const same = await test.post(post, otherKey).expect(409);
      const other = await test.post({ ...post, serialNumber: 'A-5', lot: 'L1' }, otherKey).expect(409);
      expect(same.body).toEqual(other.body);
      expect(JSON.stringify(same.body)).not.toContain('SECRET');
      await test.http.get(`/api/v1/results/${post.resultId}`).set('X-API-Key', otherKey).expect(404);
    });

    it('may come from a new key of the same station', async () => {
      const post = aResult({ serialNumber: 'A-6' });
      const first = await test.post(post).expect(201);
      const again = await test.post(post, await test.keyFor('north-1')).expect(200);
      expect(again.body).toEqual(first.body);
    });

    it('may come at the same moment: one is stored, the others get its answer', async () => {
      const post = aResult({ serialNumber: 'A-7' });
      const answers = await Promise.all(Array.from({ length: 8 }, () => test.post(post)));
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 200, 200, 200, 200, 201]);
      for (const { body } of answers) expect(body).toEqual(answers[0]!.body);
    });

    it('tells upper from lower case neither in the id nor in finding it', async () => {
      const post = aResult({ serialNumber: 'A-8' });
      await test.post(post).expect(201);
      await test.post({ ...post, resultId: post.resultId.toUpperCase() }).expect(409);
      const viewer = await test.as('viewer');
      await viewer.get(`/api/v1/results/${post.resultId.toUpperCase()}`).expect(200);
    });
  });

  describe('without a right to', () => {
    it('is answered 401 without, with an empty, with an unknown or with a spoilt key', async () => {
      const post = JSON.stringify(aResult());
      const key = await test.keyFor('north-1');
      const spoilt = key.slice(0, -1) + (key.endsWith('A') ? 'B' : 'A');
      const before = await refusedCount();
      for (const given of [
        undefined,
        '',
        'amk_',
        'amk_aaaaaaaa_' + 'x'.repeat(43),
        spoilt,
        `Bearer ${key}`,
      ]) {
        const call = request(test.app.getHttpServer()).post('/api/v1/results').type('json').send(post);
        const { body, status } = await (given === undefined ? call : call.set('X-API-Key', given));
        expect([given, status, body.code]).toEqual([given, 401, 'key_unknown']);
      }
      expect(await refusedCount()).toBe(before);
    });

    it('is answered 401 to a person, however well signed in', async () => {
      const administrator = await test.as('administrator');
      const { body } = await administrator.post('/api/v1/results').send(aResult()).expect(401);
      expect(body.code).toBe('key_unknown');
    });

    it('is answered 403 with a revoked key, an expired key, or for a station out of service', async () => {
      const integrator = await test.as('integrator');
      const revoked = await integrator
        .post('/api/v1/stations/north-2/keys')
        .send({ label: 'old', practice: false })
        .expect(201);
      await test.post(aResult({ serialNumber: 'A-9' }), revoked.body.key).expect(201);
      await integrator.post(`/api/v1/stations/north-2/keys/${revoked.body.keyId}/revoke`).expect(200);
      const answers = [await test.post(aResult(), revoked.body.key).expect(403)];

      const brief = await test.keyFor('north-2', { expiresAt: new Date(startOfTest + 1000).toISOString() });
      await test.post(aResult({ serialNumber: 'A-10' }), brief).expect(201);
      test.clock.now += 1000;
      answers.push(await test.post(aResult(), brief).expect(403));
      test.clock.now = startOfTest;

      await integrator.post('/api/v1/stations').send({ station: 'resting', line: 'north' }).expect(201);
      const resting = await test.keyFor('resting');
      await test.app
        .get(Writer)
        .run((transaction) => Station.update({ active: false }, { where: { name: 'resting' }, transaction }));
      await test.app.get(StationRegister, { strict: false }).reload();
      const before = await refusedCount();
      answers.push(await test.post('{not json', resting).expect(403));
      expect(answers.map(({ body }) => body.code)).toEqual([
        'key_revoked',
        'key_expired',
        'station_inactive',
      ]);
      expect(await refusedCount()).toBe(before);
    });
  });

  describe('in a way that is not read here', () => {
    const raw = (): request.Test => test.http.post('/api/v1/results').set('X-API-Key', otherKey);

    it.each(['text/plain', 'application/xml', 'application/x-www-form-urlencoded', 'multipart/form-data'])(
      'is answered 415 as %s',
      async (type) => {
        const { body } = await raw().set('Content-Type', type).send('{}').expect(415);
        expect(body.detail).toContain('application/json');
      },
    );

    it('is answered 415 with a content coding other than gzip', async () => {
      await raw().type('json').set('Content-Encoding', 'br').send('{}').expect(415);
    });

    it('is accepted gzipped, with a charset named, and with the coding in capitals', async () => {
      for (const [type, coding] of [
        ['application/json', 'gzip'],
        ['application/json; charset=utf-8', 'GZIP'],
      ] as const) {
        const body = gzipSync(JSON.stringify(aResult({ serialNumber: `Z-${coding}` })));
        await raw()
          .set('Content-Type', type)
          .set('Content-Encoding', coding)
          .serialize((b) => b as never)
          .send(body as never)
          .expect(201);
      }
    });

    it('is answered 413 above a megabyte, whether announced, chunked or unpacked', async () => {
      const large = JSON.stringify({ ...aResult(), notes: 'x'.repeat(1_000_001) });
      await test.post(large).expect(413);
      const bomb = gzipSync(Buffer.alloc(200_000_000, 0x20));
      expect(bomb.length).toBeLessThan(1_000_000);
      const { body } = await raw()
        .set('Content-Type', 'application/json')
        .set('Content-Encoding', 'gzip')
        .serialize((b) => b as never)
        .send(bomb as never)
        .expect(413);
      expect(body.code).toBe('too_large');
      const chunked = await fetch(`${await test.app.getUrl()}/api/v1/results`, {
        method: 'POST',
        headers: { 'X-API-Key': otherKey, 'Content-Type': 'application/json' },
        body: new Blob([large]).stream(),
        duplex: 'half',
      } as RequestInit);
      expect(chunked.status).toBe(413);
    });

    it('is accepted at the same address in capitals, with a slash or a question behind it', async () => {
      for (const path of ['/API/V1/RESULTS', '/api/v1/results/', '/api/v1/results?line=2']) {
        const post = aResult({ serialNumber: path });
        const server = test.app.getHttpServer();
        await request(server).post(path).set('X-API-Key', otherKey).send(post).expect(201);
      }
    });

    it('is answered 404 at an address beside the right one', async () => {
      for (const path of ['/api/v1/result', '/api/v2/results', '/api/v1/results/x/y']) {
        const answer = await request(test.app.getHttpServer()).post(path).send('{}');
        expect([path, answer.status, answer.body.code]).toEqual([path, 404, 'not_found']);
        expect(answer.type).toBe('application/problem+json');
      }
    });
  });
});
