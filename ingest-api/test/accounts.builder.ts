import type { Server } from 'node:http';
import type { INestApplicationContext } from '@nestjs/common';
import { hashSync } from 'bcryptjs';
import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import type { Role } from '../src/auth/roles.js';
import { Writer } from '../src/database/writer.js';
import { User } from '../src/users/models/user.model.js';
import { testPassword } from './create-test-app.js';
import { expectDocumented } from './expect-documented.js';

const passwordHash = hashSync(testPassword, 4);

export const sameOrigin = { 'Sec-Fetch-Site': 'same-origin' };

interface AccountWish {
  email: string;
  displayName: string;
  role: Role;
  active: boolean;
  demo: boolean;
}

/** Stores an account. */
export function addAccount(app: INestApplicationContext, wish: Partial<AccountWish> = {}): Promise<User> {
  const email = wish.email ?? 'rosalind.hart@fernhollow.example';
  const account = { displayName: 'Rosalind Hart', role: 'viewer', active: true, demo: false, ...wish, email };
  const createdAt = Date.parse('2026-11-01T08:00:00Z');
  return app
    .get(Writer, { strict: false })
    .run((transaction) =>
      User.create({ ...account, passwordHash, createdAt, lastSignInAt: null }, { transaction }),
    );
}

/** Asks with a clean cookie jar each time; every answer is checked against the OpenAPI document. */
export function ask(server: Server): TestAgent {
  const agent = request.agent(server);
  agent.use((call: unknown) => void (call as request.Test).expect(expectDocumented));
  return agent;
}

/** Signs in and returns the headers of a page of this site that carry the session. */
export async function signIn(
  server: Server,
  email: string,
  password = testPassword,
): Promise<{ Cookie: string; 'Sec-Fetch-Site': string }> {
  const response = await ask(server)
    .post('/api/v1/session')
    .set(sameOrigin)
    .send({ email, password })
    .expect(200);
  const [cookie = ''] = response.get('Set-Cookie') ?? [];
  return { Cookie: cookie.split(';')[0]!, ...sameOrigin };
}
