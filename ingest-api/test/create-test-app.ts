import 'reflect-metadata';
import { mkdtempSync, rmSync } from 'node:fs';
import type { Server } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { hashSync } from 'bcryptjs';
import request from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import { ApiKeysService } from '../src/api-keys/api-keys.service.js';
import type { Role } from '../src/auth/roles.js';
import { roles } from '../src/auth/roles.js';
import { type Env, readEnv } from '../src/config/env.js';
import { createApp } from '../src/create-app.js';
import { Writer } from '../src/database/writer.js';
import { SiteSetupService } from '../src/site-setup/site-setup.service.js';
import { User } from '../src/users/models/user.model.js';
import { aSite } from './builders.js';
import { expectDocumented } from './expect-documented.js';

/** Where every test's clock stands unless it moves it. */
export const startOfTest = Date.parse('2026-11-30T12:00:00.000Z');
export const testPassword = 'wren-on-a-copper-wire';
export const emailOf = (role: Role): string => `${role.toLowerCase()}@site.example`;

export interface TestApp {
  app: NestExpressApplication;
  env: Env;
  /** Asks without session or key; every answer is checked against the OpenAPI document. */
  http: TestAgent;
  clock: { now: number };
  /** Asks as a signed-in person of the role. */
  as(role: Role): Promise<TestAgent>;
  /** Makes a key for a station. */
  keyFor(station: string, options?: { practice?: boolean; expiresAt?: string }): Promise<string>;
  /** Posts a result as a station would. */
  post(body: unknown, key?: string): request.Test;
  close(): Promise<void>;
}

const testKeys = new WeakMap<NestExpressApplication, string>();

/** The real module over a temporary SQLite file, with one account a role and the site of `aSite()`. */
export async function createTestApp(settings: Record<string, string> = {}): Promise<TestApp> {
  const dataDir = mkdtempSync(join(tmpdir(), 'ampkeep-test-'));
  const clock = { now: startOfTest };
  const env = readEnv({
    AMPKEEP_MODE: 'demo',
    AMPKEEP_DATA_DIR: dataDir,
    AMPKEEP_TIME_ZONE: 'UTC',
    AMPKEEP_LOG_LEVEL: process.env['AMPKEEP_LOG_LEVEL'] ?? 'fatal',
    AMPKEEP_PORT: '0',
    AMPKEEP_POSTS_PER_MINUTE: '1000000',
    ...settings,
  });
  const app = await createApp(env, () => clock.now);
  await app.listen(0, '127.0.0.1');
  await createAccounts(app, clock.now);
  await app.get(SiteSetupService, { strict: false }).apply(aSite(), 'test');
  const server = app.getHttpServer();
  const keyFor: TestApp['keyFor'] = async (station, { practice = false, expiresAt = null } = {}) => {
    const made = await app
      .get(ApiKeysService, { strict: false })
      .create(station, { label: 'test', practice, expiresAt }, 'test');
    return made.key;
  };
  testKeys.set(app, await keyFor('north-1'));
  return {
    app,
    env,
    clock,
    keyFor,
    http: documented(server),
    as: (role) => signIn(server, role),
    post: (body, key = testKeys.get(app)!) =>
      documented(server)
        .post('/api/v1/results')
        .set('X-API-Key', key)
        .type('application/json')
        .send(typeof body === 'string' ? body : JSON.stringify(body)),
    close: async () => {
      await app.close();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}

/** An agent whose every answer must be one that the OpenAPI document names. */
function documented(server: Server): TestAgent {
  const agent = request.agent(server);
  agent.use(
    (call: unknown) =>
      void (call as request.Test).set('Sec-Fetch-Site', 'same-origin').expect(expectDocumented),
  );
  return agent;
}

async function signIn(server: Server, role: Role): Promise<TestAgent> {
  const agent = documented(server);
  await agent
    .post('/api/v1/session')
    .send({ email: emailOf(role), password: testPassword })
    .expect(200);
  return agent;
}

async function createAccounts(app: NestExpressApplication, createdAt: number): Promise<void> {
  const passwordHash = hashSync(testPassword, 4);
  await app.get(Writer, { strict: false }).run(async (transaction) => {
    await User.bulkCreate(
      roles.map((role) => ({
        email: emailOf(role),
        displayName: `Test ${role}`,
        role,
        passwordHash,
        active: true,
        demo: false,
        createdAt,
        lastSignInAt: null,
      })),
      { transaction },
    );
  });
}
