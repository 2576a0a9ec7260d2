import type { Server } from 'node:http';
import type { RightDto } from '../src/auth/dto/right.dto.js';
import { type Access, rights } from '../src/auth/rights.js';
import { roles } from '../src/auth/roles.js';
import { ask, sameOrigin, signIn } from './accounts.builder.js';
import { createTestApp, emailOf, type TestApp } from './create-test-app.js';

interface Layer {
  route?: { path: string; methods: Record<string, boolean> };
}

const table: [route: string, access: Access][] = Object.entries(rights);

/** Where Nest mounts middleware (logging), which answers nothing by itself. */
const middlewarePaths = ['/api/v1', '/api/v1/{*path}'];

/** Something for every parameter; the things asked for need not exist. */
const concrete = (path: string): string => path.replace(/:\w+/g, '0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11');

describe('rights', () => {
  let test: TestApp;
  const server = (): Server => test.app.getHttpServer();

  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());

  /** Status and problem code; the body of an answer that never ends (live events) is not waited for. */
  async function knock(
    route: string,
    headers: Record<string, string>,
  ): Promise<{ status: number; code?: string }> {
    const [method = '', path = ''] = route.split(' ');
    const aborter = new AbortController();
    const response = await fetch((await test.app.getUrl()) + concrete(path), {
      method,
      headers: { 'Content-Type': 'application/json', ...headers },
      ...(['POST', 'PATCH'].includes(method) ? { body: '{}' } : {}),
      signal: aborter.signal,
    });
    const problem = response.headers.get('Content-Type')?.startsWith('application/problem+json');
    const { code } = problem ? ((await response.json()) as { code: string }) : {};
    aborter.abort();
    return { status: response.status, code };
  }

  it('have an entry for every route that runs, and a route for every entry', () => {
    const { stack } = (test.app.getHttpAdapter().getInstance() as { router: { stack: Layer[] } }).router;
    const running = stack.flatMap(({ route }) =>
      route?.path.startsWith('/api') && !middlewarePaths.includes(route.path)
        ? Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${route.path}`)
        : [],
    );
    expect(running.sort()).toEqual(Object.keys(rights).sort());
  });

  it.each(table)('%s lets in whom the table names and nobody else', async (route, access) => {
    const stranger = await knock(route, sameOrigin);
    if (access.public) {
      expect(stranger.code ?? '').not.toMatch(/not_signed_in|key_unknown|origin_not_allowed/);
      return;
    }
    expect(stranger).toEqual({ status: 401, code: access.roles ? 'not_signed_in' : 'key_unknown' });
    for (const role of roles) {
      const session = await signIn(server(), emailOf(role));
      const answer = await knock(route, session);
      if (!access.roles) expect(answer).toEqual({ status: 401, code: 'key_unknown' });
      else if (!access.roles.includes(role))
        expect(answer).toEqual({ status: 403, code: 'role_not_allowed' });
      else expect([401, 403, 500]).not.toContain(answer.status);
    }
  });

  it.each(table.filter(([, access]) => !access.public))(
    '%s is open to the key of a station only where the table says so',
    async (route, access) => {
      const answer = await knock(route, { 'X-API-Key': await test.keyFor('north-1'), ...sameOrigin });
      if (access.station) expect([401, 403, 500]).not.toContain(answer.status);
      else expect(answer).toEqual({ status: 401, code: 'not_signed_in' });
    },
  );

  it.each(table.filter(([route, access]) => !route.startsWith('GET') && !access.station))(
    '%s is not taken from a page of another site',
    async (route, access) => {
      const role = access.roles?.[0] ?? 'viewer';
      const { Cookie } = await signIn(server(), emailOf(role));
      const answer = await knock(route, { Cookie, Origin: 'https://elsewhere.example' });
      expect(answer).toEqual({ status: 403, code: 'origin_not_allowed' });
    },
  );

  it('are listed for whoever is signed in, each with what it is for', async () => {
    const session = await signIn(server(), emailOf('viewer'));
    const { body } = await ask(server()).get('/api/v1/rights').set(session).expect(200);
    const listed = body as RightDto[];
    expect(listed).toHaveLength(table.length);
    expect(listed.filter(({ summary }) => summary === '')).toEqual([]);
    expect(listed).toContainEqual({
      method: 'PATCH',
      path: '/api/v1/users/{userId}',
      summary: "Change an account's name, role or password, disable or enable it",
      access: 'roles',
      roles: ['administrator'],
    });
    const accessOf = (path: string) => listed.find((right) => right.path === path)?.access;
    expect(accessOf('/api/v1/session')).toBe('public');
    expect(accessOf('/api/v1/rights')).toBe('anySignedIn');
    expect(accessOf('/api/v1/results')).toBe('station');
  });

  it('answer an unknown address with 404, signed in or not', async () => {
    expect(await knock('GET /api/v1/nowhere', {})).toEqual({ status: 404, code: 'not_found' });
  });
});
