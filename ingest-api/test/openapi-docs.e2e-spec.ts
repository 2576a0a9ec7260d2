import request from 'supertest';
import { parse } from 'yaml';
import { errorCatalogue } from '../src/docs/error-catalogue.js';
import { resultSchema } from '../src/results/validate-post.js';
import { createTestApp, type TestApp } from './create-test-app.js';

describe('the API docs', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());
  const get = (path: string) => request(test.app.getHttpServer()).get(path);
  const outside = /(?:src|href)="(?:https?:)?\/\//;

  it.each(['/docs', '/docs/'])('are open to everyone at %s and take nothing from elsewhere', async (path) => {
    const page = await get(path)
      .expect(200)
      .expect('Content-Type', /^text\/html/);
    expect(page.text).toContain('Ampkeep API');
    expect(page.text).not.toMatch(outside);
    const scripts = [...page.text.matchAll(/src="([^"]+)"/g)].map((match) => match[1]!);
    expect(scripts.length).toBeGreaterThan(0);
    for (const script of scripts) await get(new URL(script, `http://x${path}`).pathname).expect(200);
  });

  it('have the document, the schema and the errors to download and link to', async () => {
    const document = await get('/docs/openapi.yaml')
      .expect(200)
      .expect('Content-Type', /^application\/yaml/);
    expect(parse(document.text ?? document.body.toString())).toMatchObject({
      openapi: '3.1.0',
      info: { title: 'Ampkeep' },
    });
    const schema = await get('/docs/result.schema.json')
      .expect(200)
      .expect('Content-Type', /^application\/schema\+json/);
    expect(JSON.parse(schema.text ?? schema.body.toString())).toEqual(resultSchema);
    const errors = await get('/docs/errors')
      .expect(200)
      .expect('Content-Type', /^text\/html/);
    expect(errors.text).not.toMatch(outside);
    for (const { code } of errorCatalogue) expect(errors.text).toContain(`id="${code}"`);
  });

  it('explain every problem where its type points to', async () => {
    const problems = await Promise.all([
      get('/api/v1/nowhere'),
      get('/api/v1/today'),
      get('/api/v1/results/%'),
      test.post('{'),
      test.post({}),
    ]);
    const { text } = await get('/docs/errors');
    for (const { body } of problems) {
      expect(body.type).toBe(`/docs/errors#${body.code}`);
      expect(text).toContain(`id="${body.code}"`);
    }
  });

  it('come with headers that keep other sites and scripts out', async () => {
    const { headers } = await get('/docs/errors');
    expect(headers['content-security-policy']).toContain("script-src 'self'");
    expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['x-content-type-options']).toBe('nosniff');
  });
});
