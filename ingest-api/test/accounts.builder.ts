import type { INestApplicationContext } from '@nestjs/common';
import { hashSync } from 'bcryptjs';
import request from 'supertest';
import type { App } from 'supertest/types.js';
import type { Role } from '../src/auth/roles.js';
import { Writer } from '../src/database/writer.js';
import { User } from '../src/users/models/user.model.js';

/** Every account made here has it. */
export const password = 'three blue resistors';

const passwordHash = hashSync(password, 4);

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
  const email = (wish.email ?? `${wish.role ?? 'viewer'}@fernhollow.example`).toLowerCase();
  const account = { displayName: 'Rosalind Hart', role: 'viewer', active: true, demo: false, ...wish, email };
  const createdAt = Date.parse('2026-11-01T08:00:00Z');
  return app
    .get(Writer)
    .run((transaction) =>
      User.create({ ...account, passwordHash, createdAt, lastSignInAt: null }, { transaction }),
    );
}

/** Signs in and returns the header that carries the session. */
export async function signIn(
  server: App,
  email: string,
  withPassword = password,
): Promise<{ Cookie: string; 'Sec-Fetch-Site': string }> {
  const response = await request(server)
    .post('/api/v1/session')
    .set(sameOrigin)
    .send({ email, password: withPassword })
    .expect(200);
  const [cookie = ''] = response.get('Set-Cookie') ?? [];
  return { Cookie: cookie.split(';')[0]!, ...sameOrigin };
}
