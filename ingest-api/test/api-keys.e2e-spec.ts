import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type TestAgent from 'supertest/lib/agent.js';
import { ApiKeysService } from '../src/api-keys/api-keys.service.js';
import { ApiKey } from '../src/api-keys/models/api-key.model.js';
import { readEnv } from '../src/config/env.js';
import { createApp } from '../src/create-app.js';
import { SiteSetupService } from '../src/site-setup/site-setup.service.js';
import { aResult, aSite } from './builders.js';
import { createTestApp, emailOf, startOfTest, type TestApp } from './create-test-app.js';

const path = '/api/v1/stations/north-2/keys';

describe('API keys', () => {
  let test: TestApp;
  let integrator: TestAgent;
  beforeEach(async () => {
    test = await createTestApp();
    integrator = await test.as('integrator');
  });
  afterEach(() => test.close());
  const create = async (wanted: object = {}) =>
    (
      await integrator
        .post(path)
        .send({ label: 'rack PC', practice: false, ...wanted })
        .expect(201)
    ).body;
  const list = async () => (await integrator.get(path).expect(200)).body;

  it('are shown whole once, and nowhere after', async () => {
    const made = await create({ label: 'rack PC, bay 2', expiresAt: '2027-12-01T00:00:00.000Z' });
    expect(made).toEqual({
      key: expect.stringMatching(/^amk_[a-z0-9]{8}_[\w-]{43}$/),
      keyId: expect.any(Number),
      prefix: made.key.slice(4, 12),
      label: 'rack PC, bay 2',
      practice: false,
      state: 'active',
      createdAt: new Date(startOfTest).toISOString(),
      createdBy: emailOf('integrator'),
      expiresAt: '2027-12-01T00:00:00.000Z',
      revokedAt: null,
      lastUsedAt: null,
    });
    const secret = made.key.slice(13);
    await test.post(aResult(), made.key).expect(201);
    await test.post('{', made.key).expect(400);
    const administrator = await test.as('administrator');
    const everything = await Promise.all([
      integrator.get(path),
      integrator.get('/api/v1/stations'),
      integrator.get('/api/v1/intake'),
      administrator.get('/api/v1/audit'),
    ]);
    expect(JSON.stringify(everything.map(({ body }) => body))).not.toContain(secret);
    for (const file of readdirSync(test.env.dataDir).filter((name) => name.includes('sqlite'))) {
      expect(readFileSync(join(test.env.dataDir, file)).includes(secret)).toBe(false);
    }
  });

  it('stand in the audit trail by prefix, made and revoked', async () => {
    const { keyId, prefix } = await create();
    await integrator.post(`${path}/${keyId}/revoke`).expect(200);
    const administrator = await test.as('administrator');
    const { body } = await administrator.get('/api/v1/audit').expect(200);
    const entries = body.items.filter((entry: { subject: string }) => entry.subject === `north-2 ${prefix}`);
    expect(entries.map((entry: { action: string; actor: string }) => [entry.action, entry.actor])).toEqual([
      ['apiKey.revoked', emailOf('integrator')],
      ['apiKey.created', emailOf('integrator')],
    ]);
  });

  it('end at once when revoked, and revoking twice changes nothing', async () => {
    const { key, keyId } = await create();
    await test.post(aResult(), key).expect(201);
    const revoked = await integrator.post(`${path}/${keyId}/revoke`).expect(200);
    expect(revoked.body).toMatchObject({ state: 'revoked', revokedAt: new Date(startOfTest).toISOString() });
    await test.post(aResult(), key).expect(403);
    test.clock.now += 60_000;
    const again = await integrator.post(`${path}/${keyId}/revoke`).expect(200);
    expect(again.body).toEqual(revoked.body);
  });

  it('end when their time has come', async () => {
    const { key } = await create({ expiresAt: '2026-11-30T13:00:00.000Z' });
    test.clock.now = Date.parse('2026-11-30T12:59:59.999Z');
    await test.post(aResult(), key).expect(201);
    expect((await list())[0].state).toBe('active');
    test.clock.now += 1;
    expect((await test.post(aResult(), key).expect(403)).body.code).toBe('key_expired');
    expect((await list())[0].state).toBe('expired');
  });

  it('read back only what their own station posted', async () => {
    const { key } = await create();
    const own = await test.post(aResult({ serialNumber: 'OWN' }), key).expect(201);
    const foreign = await test.post(aResult({ serialNumber: 'FOREIGN' })).expect(201);
    const asStation = (url: string) => test.http.get(url).set('X-API-Key', key);
    await asStation(own.body.links.self).expect(200);
    await asStation(foreign.body.links.self).expect(404);
    for (const url of ['/api/v1/results', '/api/v1/units', '/api/v1/intake', '/api/v1/stations', path]) {
      await asStation(url).expect(401);
    }
  });

  it('tell when they were last used without a write for each post', async () => {
    const { key, keyId } = await create();
    const rows = async () => (await ApiKey.findByPk(keyId, { rejectOnEmpty: true })).lastUsedAt;
    for (let i = 1; i <= 5; i += 1) {
      test.clock.now = startOfTest + i * 1000;
      await test.post(aResult(), key).expect(201);
      expect(await rows()).toBeNull();
    }
    const used = new Date(startOfTest + 5000).toISOString();
    expect((await list())[0].lastUsedAt).toBe(used);
    await test.app.get(ApiKeysService, { strict: false }).saveLastUses();
    expect(await rows()).toBe(startOfTest + 5000);
    expect((await list())[0].lastUsedAt).toBe(used);
  });

  it.each<[string, object, string]>([
    ['no label', { label: '' }, '/label'],
    ['a label of spaces', { label: '   ' }, '/label'],
    ['a long label', { label: 'x'.repeat(81) }, '/label'],
    ['a practice that is no yes or no', { practice: 'yes' }, '/practice'],
    ['an end in the past', { expiresAt: '2026-11-30T12:00:00.000Z' }, '/expiresAt'],
    ['an end that is no day', { expiresAt: '2027-02-30T00:00:00Z' }, '/expiresAt'],
    ['an end by week', { expiresAt: '2027-W05' }, '/expiresAt'],
    ['an end by day of the year', { expiresAt: '2027-335' }, '/expiresAt'],
    ['an end without zone', { expiresAt: '2027-12-01T00:00:00' }, '/expiresAt'],
    ['an end that is a number', { expiresAt: 1893456000000 }, '/expiresAt'],
    ['a wish unknown', { scope: 'all' }, '/scope'],
  ])('are not made with %s', async (_, wrong, pointer) => {
    const wanted = { label: 'x', practice: false, ...wrong };
    const { body } = await integrator.post(path).send(wanted).expect(422);
    expect(body.errors).toContainEqual(expect.objectContaining({ pointer }));
    expect(await list()).toEqual([]);
  });

  it('are not found for a station or a number that is not there', async () => {
    const { keyId } = await create();
    await integrator.get('/api/v1/stations/nowhere/keys').expect(404);
    await integrator.post('/api/v1/stations/nowhere/keys').send({ label: 'x', practice: false }).expect(404);
    await integrator.post(`/api/v1/stations/north-1/keys/${keyId}/revoke`).expect(404);
    await integrator.post(`${path}/999999/revoke`).expect(404);
    await integrator.post(`${path}/none/revoke`).expect(404);
    await integrator.post(`${path}/1e1/revoke`).expect(404);
    expect((await list())[0].state).toBe('active');
  });
});

describe('API keys after the server was started anew', () => {
  it('still work or are still revoked, and remember their last use', async () => {
    const dataDir = mkdtempSync(join(tmpdir(), 'ampkeep-restart-'));
    const env = readEnv({ AMPKEEP_MODE: 'demo', AMPKEEP_DATA_DIR: dataDir, AMPKEEP_LOG_LEVEL: 'silent' });
    const start = async () => {
      const app = await createApp(env, () => startOfTest);
      await app.init();
      return { app, keys: app.get(ApiKeysService, { strict: false }) };
    };
    const wanted = { label: 'x', practice: false, expiresAt: null };
    const first = await start();
    await first.app.get(SiteSetupService, { strict: false }).apply(aSite(), 'test');
    const kept = await first.keys.create('north-1', wanted, 'test');
    const revoked = await first.keys.create('north-1', wanted, 'test');
    await first.keys.revoke('north-1', revoked.record.apiKeyId, 'test');
    expect(first.keys.authenticate(kept.key)).toMatchObject({ station: 'north-1' });
    await first.app.close();

    const second = await start();
    expect(second.keys.list('north-1').map((key) => second.keys.lastUsedAt(key))).toEqual([
      null,
      startOfTest,
    ]);
    expect(second.keys.authenticate(kept.key)).toMatchObject({ station: 'north-1', practice: false });
    expect(() => second.keys.authenticate(revoked.key)).toThrow(/revoked/);
    await second.app.close();
    rmSync(dataDir, { recursive: true });
  });
});
