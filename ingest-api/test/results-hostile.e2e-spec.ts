import fc from 'fast-check';
import type { Response } from 'supertest';
import { createTestApp, emailOf, type TestApp, testPassword } from './create-test-app.js';
import { expectDocumented } from './expect-documented.js';
import { type HostileBody, hostileBodies } from './hostile-posts.builder.js';

const bodies = fc.sample(hostileBodies, {
  numRuns: 2000,
  seed: 20261130,
});
const atOnce = 25;

interface Answer {
  status: number;
  body: Record<string, unknown>;
}

describe('two thousand hostile bodies', () => {
  let test: TestApp;
  let base: string;
  let key: string;
  let cookie: string;
  const sample = (body: HostileBody): string =>
    typeof body === 'string'
      ? body.slice(0, 3000)
      : `bytes ${Buffer.from(body).toString('hex').slice(0, 400)}`;

  beforeAll(async () => {
    test = await createTestApp();
    base = await test.app.getUrl();
    key = await test.keyFor('north-2');
    const signIn = await fetch(`${base}/api/v1/session`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', 'Sec-Fetch-Site': 'same-origin' },
      body: JSON.stringify({ email: emailOf('viewer'), password: testPassword }),
    });
    cookie = signIn.headers.getSetCookie()[0]!.split(';')[0]!;
  }, 60_000);
  afterAll(() => test.close(), 60_000);

  /** Like supertest, but over kept connections: there are thousands of requests to make. */
  async function ask(
    method: string,
    path: string,
    headers: Record<string, string>,
    body?: HostileBody,
  ): Promise<Answer> {
    const response = await fetch(base + path, {
      method,
      headers: { ...headers, 'Accept-Encoding': 'identity' },
      body,
    });
    const text = await response.text();
    expectDocumented({
      request: { method, url: base + path },
      status: response.status,
      headers: Object.fromEntries(response.headers),
      text,
    } as unknown as Response);
    return { status: response.status, body: JSON.parse(text) as Record<string, unknown> };
  }

  async function postAndReadBack(body: HostileBody): Promise<number> {
    const posted = await ask(
      'POST',
      '/api/v1/results',
      { 'X-API-Key': key, 'Content-Type': 'application/json' },
      body,
    );
    if (posted.status >= 500) throw new Error(`answered ${posted.status}`);
    if (posted.status >= 300) return posted.status;
    const { self, unit } = posted.body['links'] as { self: string; unit: string };
    const result = await ask('GET', self, { 'X-API-Key': key });
    const page = await ask('GET', `/api/v1${unit}`, { Cookie: cookie });
    expect([result.status, page.status]).toEqual([200, 200]);
    expect(result.body['verdict']).toBe(posted.body['verdict']);
    expect(JSON.stringify(page.body)).toContain(String(posted.body['resultId']));
    return posted.status;
  }

  it('are refused in words or can be read back, every one', async () => {
    const counts = new Map<number, number>();
    const broken: string[] = [];
    for (let start = 0; start < bodies.length; start += atOnce) {
      await Promise.all(
        bodies.slice(start, start + atOnce).map(async (body) => {
          try {
            const status = await postAndReadBack(body);
            counts.set(status, (counts.get(status) ?? 0) + 1);
          } catch (error) {
            broken.push(`${(error as Error).message.slice(0, 600)}\n${sample(body)}`);
          }
        }),
      );
    }
    expect(broken.slice(0, 5)).toEqual([]);
    // The generators reach all doors, not only the first.
    expect([...counts.keys()].sort()).toEqual([201, 400, 422]);
    expect(counts.get(201)).toBeGreaterThan(500);
  }, 120_000);
});
