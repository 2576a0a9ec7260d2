import type { Transaction } from 'sequelize';
import sqlite3 from 'sqlite3';
import { databaseFile } from '../src/database/sqlite-options.js';
import { runStatement } from '../src/database/sql.js';
import { Writer, WRITER_OPTIONS, type WriterOptions } from '../src/database/writer.js';
import { aFailingResult, aResult } from './builders.js';
import { createTestApp, type TestApp } from './create-test-app.js';

const retryAfter = /^[1-9]\d*$/;

describe('posting more than is read', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp({ AMPKEEP_POSTS_PER_MINUTE: '3' });
  });
  afterAll(() => test.close());

  it('is answered 429 with a pause, key by key, and nothing of it is kept', async () => {
    for (const serialNumber of ['T-1', 'T-2']) await test.post(aResult({ serialNumber })).expect(201);
    await test.post('{').expect(400);
    const refused = await test.post(aResult({ serialNumber: 'T-4' })).expect(429);
    expect(refused.headers['retry-after']).toMatch(retryAfter);
    expect(Number(refused.headers['retry-after'])).toBeLessThanOrEqual(60);
    expect(refused.body).toMatchObject({
      code: 'too_many_requests',
      detail: expect.stringContaining('Retry-After'),
    });

    await test.post(aResult({ serialNumber: 'T-5' }), await test.keyFor('north-1')).expect(201);
    const integrator = await test.as('integrator');
    const { body } = await integrator.get('/api/v1/intake').expect(200);
    expect(body.items.map((item: { status: number }) => item.status).sort()).toEqual([201, 201, 201, 400]);
  });

  it('holds up no person', async () => {
    const viewer = await test.as('viewer');
    for (let i = 0; i < 10; i += 1) await viewer.get('/api/v1/results').expect(200);
  });
});

describe('posting while nothing can be stored', () => {
  let test: TestApp;
  let writer: Writer;
  beforeEach(async () => {
    test = await createTestApp();
    writer = test.app.get(Writer);
  });
  afterEach(() => test.close());

  /** Past the writer's queue, which can do nothing while its connection is in trouble. */
  const onWriter = (sql: string) =>
    runStatement((writer as unknown as { transaction: Transaction }).transaction, sql);
  const rows = (sql: string): Promise<{ n: number }> =>
    new Promise((resolve, reject) => {
      const other = new sqlite3.Database(databaseFile(test.env.dataDir), sqlite3.OPEN_READONLY);
      other.get<{ n: number }>(sql, (error, row) => (error ? reject(error) : resolve(row)));
      other.close();
    });

  it('is answered 503 with a pause when the disk is full, stores nothing, and goes on when there is room', async () => {
    await test.post(aResult({ serialNumber: 'F-0' })).expect(201);
    await onWriter('PRAGMA max_page_count = 1');
    const post = aFailingResult({ serialNumber: 'F-1', notes: 'x'.repeat(500) });
    const large = {
      ...post,
      extra: Object.fromEntries(Array.from({ length: 20 }, (_, i) => [`k${i}`, `${Math.sin(i)}`.repeat(20)])),
    };
    let answer = await test.post(large);
    // The file's free pages may take one or the other.
    for (let i = 0; answer.status === 201 && i < 50; i += 1) {
      answer = await test.post({ ...large, resultId: crypto.randomUUID(), serialNumber: `F-1-${i}` });
    }
    expect(answer.status).toBe(503);
    expect(answer.headers['retry-after']).toMatch(retryAfter);
    expect(answer.body).toMatchObject({
      code: 'store_unavailable',
      detail: expect.stringContaining('Nothing was stored'),
    });
    const before = await rows('SELECT count(*) AS n FROM results');

    await test.post(aResult({ serialNumber: 'F-2' })).expect(503);
    expect(await rows('SELECT count(*) AS n FROM results')).toEqual(before);
    await onWriter('PRAGMA max_page_count = 1000000');
    await test.post(aResult({ serialNumber: 'F-2' })).expect(201);
  });

  it('is answered 503 when the database turned read-only, with a refused post too, and goes on after it', async () => {
    await onWriter('PRAGMA query_only = ON');
    const post = aResult({ serialNumber: 'R-1' });
    const answers = await Promise.all([test.post(post), test.post('{'), test.post(aFailingResult())]);
    expect(answers.map(({ status }) => status)).toEqual([503, 503, 503]);
    for (const { headers } of answers) expect(headers['retry-after']).toMatch(retryAfter);
    const viewer = await test.as('viewer').catch((error: Error) => error);
    expect(viewer).toBeInstanceOf(Error); // A session can't be kept either.
    await onWriter('PRAGMA query_only = OFF');
    await test.post(post).expect(201);
    expect(await rows('SELECT count(*) AS n FROM results')).toEqual({ n: 1 });
    expect(await rows('SELECT count(*) AS n FROM refused_posts')).toEqual({ n: 0 });
    expect(await rows('SELECT count(*) AS n FROM breaches')).toEqual({ n: 0 });
  });

  it('is answered 503 when too many wait', async () => {
    const options = test.app.get<WriterOptions>(WRITER_OPTIONS, { strict: false });
    options.queueLimit = 0;
    const { headers } = await test.post(aResult()).expect(503);
    expect(headers['retry-after']).toMatch(retryAfter);
    options.queueLimit = 5000;
    await test.post(aResult()).expect(201);
  });

  it('is answered 2xx only when the result can be read from the file by another program', async () => {
    const posts = Array.from({ length: 20 }, (_, i) => aResult({ serialNumber: `D-${i}` }));
    await Promise.all(
      posts.map(async (post) => {
        await test.post(post).expect(201);
        const stored = await rows(`SELECT count(*) AS n FROM results WHERE result_uuid = '${post.resultId}'`);
        expect(stored).toEqual({ n: 1 });
      }),
    );
  });

  it('that was begun before the server stops is stored, one that comes after is refused', async () => {
    const posts = Array.from({ length: 10 }, (_, i) => aResult({ serialNumber: `S-${i}` }));
    const answers = Promise.all(
      posts.map((post) =>
        test.post(post).then(
          ({ status }) => status,
          () => 0,
        ),
      ),
    );
    await new Promise((resolve) => setImmediate(resolve));
    await writer.onApplicationShutdown();
    await test.post(aResult()).expect(503);
    const stored = (await answers).filter((status) => status === 201).length;
    expect(await rows('SELECT count(*) AS n FROM results')).toEqual({ n: stored });
  });
});
