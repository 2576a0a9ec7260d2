import { readFileSync } from 'node:fs';
import type { Server } from 'node:http';
import { join } from 'node:path';
import { JwtService } from '@nestjs/jwt';
import { Session } from '../src/users/models/session.model.js';
import { addAccount, ask, sameOrigin, signIn } from './accounts.builder.js';
import { createTestApp, type TestApp, testPassword } from './create-test-app.js';

const email = 'rosalind.hart@fernhollow.example';

describe('sessions', () => {
  let test: TestApp;
  const server = (): Server => test.app.getHttpServer();
  const trySignIn = (credentials: object, headers: Record<string, string> = sameOrigin) =>
    ask(server()).post('/api/v1/session').set(headers).send(credentials);

  beforeEach(async () => {
    test = await createTestApp();
  });
  afterEach(() => test.close());

  it('begin with the right password and end with signing out', async () => {
    await addAccount(test.app, { email, role: 'qualityLead' });
    const signedIn = await trySignIn({
      email: ' Rosalind.Hart@Fernhollow.example',
      password: testPassword,
    }).expect(200);
    expect(signedIn.body).toEqual({
      user: expect.objectContaining({ email, role: 'qualityLead', lastSignInAt: '2026-11-30T12:00:00.000Z' }),
    });
    expect(JSON.stringify(signedIn.body)).not.toContain('$2');
    const [cookie = ''] = signedIn.get('Set-Cookie') ?? [];
    expect(cookie).toMatch(/^ampkeep_session=/);
    expect(cookie).toMatch(/HttpOnly/);
    expect(cookie).toMatch(/SameSite=Lax/);

    const session = { Cookie: cookie.split(';')[0]!, ...sameOrigin };
    const current = await ask(server()).get('/api/v1/session').set(session).expect(200);
    expect(current.body).toEqual(signedIn.body);
    const signedOut = await ask(server()).delete('/api/v1/session').set(session).expect(204);
    expect(signedOut.get('Set-Cookie')?.[0]).toMatch(/^ampkeep_session=;.*Expires=Thu, 01 Jan 1970/);
    await ask(server()).get('/api/v1/session').set(session).expect(401);
  });

  it('are refused in the same words for a wrong password, an unknown address and a disabled account', async () => {
    await addAccount(test.app, { email });
    await addAccount(test.app, { email: 'left@fernhollow.example', active: false });
    const answers = await Promise.all([
      trySignIn({ email, password: 'four blue resistors' }),
      trySignIn({ email: 'nobody@fernhollow.example', password: testPassword }),
      trySignIn({ email: 'left@fernhollow.example', password: testPassword }),
    ]);
    for (const answer of answers) {
      expect(answer.status).toBe(401);
      expect(answer.type).toBe('application/problem+json');
      expect(answer.body).toEqual(answers[0].body);
      expect(answer.get('Set-Cookie')).toBeUndefined();
    }
  });

  it('are refused during a pause even with the right password, and begin again after it', async () => {
    await addAccount(test.app, { email });
    await Promise.all(Array.from({ length: 5 }, () => trySignIn({ email, password: 'guess' }).expect(401)));
    const paused = await trySignIn({ email, password: testPassword }).expect(429);
    expect(paused.get('Retry-After')).toBe('15');
    expect(paused.body.code).toBe('too_many_requests');
    test.clock.now += 15_000;
    await trySignIn({ email, password: testPassword }).expect(200);
  });

  it('end after twelve hours', async () => {
    await addAccount(test.app, { email });
    const session = await signIn(server(), email);
    test.clock.now += 12 * 3600_000 - 1000;
    await ask(server()).get('/api/v1/session').set(session).expect(200);
    test.clock.now += 1000;
    await ask(server()).get('/api/v1/session').set(session).expect(401);
    await signIn(server(), email);
    expect(await Session.count()).toBe(1);
  });

  it('end elsewhere when the password is changed, but not where it was changed', async () => {
    await addAccount(test.app, { email });
    const [here, elsewhere] = [await signIn(server(), email), await signIn(server(), email)];
    await ask(server()).get('/api/v1/session').set(elsewhere).expect(200);
    const change = (body: object) => ask(server()).post('/api/v1/session/password').set(here).send(body);

    const wrong = await change({ currentPassword: 'guess', newPassword: 'seven amber cascodes' }).expect(422);
    expect(wrong.body.errors).toEqual([
      expect.objectContaining({ pointer: '/currentPassword', code: 'wrong_password' }),
    ]);
    await change({ currentPassword: testPassword, newPassword: 'short' }).expect(422);
    await change({ currentPassword: testPassword, newPassword: 'é'.repeat(37) }).expect(422);
    await ask(server()).get('/api/v1/session').set(elsewhere).expect(200);

    await change({ currentPassword: testPassword, newPassword: 'seven amber cascodes' }).expect(204);
    await ask(server()).get('/api/v1/session').set(here).expect(200);
    await ask(server()).get('/api/v1/session').set(elsewhere).expect(401);
    await trySignIn({ email, password: testPassword }).expect(401);
    await signIn(server(), email, 'seven amber cascodes');
  });

  it('are changed only from pages of this site', async () => {
    await addAccount(test.app, { email });
    const credentials = { email, password: testPassword };
    const foreign: Record<string, string>[] = [
      { Origin: 'https://elsewhere.example' },
      { Origin: 'null' },
      { Origin: 'https://elsewhere.example', 'Sec-Fetch-Site': 'same-origin' },
      { 'Sec-Fetch-Site': 'cross-site' },
      { 'Sec-Fetch-Site': 'same-site' },
      {},
    ];
    for (const headers of foreign) {
      const refused = await trySignIn(credentials, headers).expect(403);
      expect(refused.body.code).toBe('origin_not_allowed');
    }
    const own: Record<string, string>[] = [
      { Origin: test.env.publicUrl },
      { Host: 'ampkeep.plant:8080', Origin: 'http://ampkeep.plant:8080' },
      { 'Sec-Fetch-Site': 'same-origin' },
    ];
    for (const headers of own) {
      await trySignIn(credentials, headers).expect(200);
    }
    const { Cookie } = await signIn(server(), email);
    await ask(server())
      .delete('/api/v1/session')
      .set({ Cookie, Origin: 'https://elsewhere.example' })
      .expect(403);
    await ask(server())
      .get('/api/v1/session')
      .set({ Cookie, Origin: 'https://elsewhere.example' })
      .expect(200);
  });

  it('are never believed from a token that this server did not sign with its own algorithm', async () => {
    await addAccount(test.app, { email });
    const { Cookie } = await signIn(server(), email);
    const token = Cookie.replace('ampkeep_session=', '');
    const [head = '', payload = '', signature = ''] = token.split('.');
    const claims = JSON.parse(Buffer.from(payload, 'base64url').toString()) as object;
    const encoded = (value: object) => Buffer.from(JSON.stringify(value)).toString('base64url');
    const secret = readFileSync(join(test.env.dataDir, 'jwt-secret'), 'utf8').trim();
    const forged = [
      `${encoded({ alg: 'none', typ: 'JWT' })}.${payload}.`,
      `${encoded({ alg: 'none', typ: 'JWT' })}.${payload}.${signature}`,
      new JwtService({ secret: 'another secret' }).sign(claims),
      new JwtService({ secret, signOptions: { algorithm: 'HS512' } }).sign(claims),
      `${head}.${encoded({ ...claims, jti: 'other' })}.${signature}`,
      new JwtService({ secret }).sign({ ...claims, jti: 'a session that does not exist' }),
      '',
    ];
    for (const bad of forged) {
      await ask(server()).get('/api/v1/session').set('Cookie', `ampkeep_session=${bad}`).expect(401);
    }
    await ask(server()).get('/api/v1/session').set('Cookie', `ampkeep_session=${token}`).expect(200);
  });
});
