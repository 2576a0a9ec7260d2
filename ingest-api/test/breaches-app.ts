import { mkdtempSync, rmSync } from 'node:fs';
import type { Server } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Test } from '@nestjs/testing';
import { AppModule } from '../src/app.module.js';
import { readEnv } from '../src/config/env.js';
import { configureApp } from '../src/configure-app.js';
import { prepareDatabase } from '../src/database/prepare-database.js';

export async function createTestApp(settings: Record<string, string> = {}) {
  const dataDir = mkdtempSync(join(tmpdir(), 'ampkeep-test-'));
  const env = readEnv({
    AMPKEEP_MODE: 'demo',
    AMPKEEP_DATA_DIR: dataDir,
    AMPKEEP_LOG_LEVEL: 'silent',
    ...settings,
  });
  const time = { now: Date.parse('2026-11-30T08:00:00Z') };
  await prepareDatabase(dataDir);
  const module = await Test.createTestingModule({ imports: [AppModule.for(env, () => time.now)] }).compile();
  const app = module.createNestApplication({ logger: false });
  configureApp(app);
  await app.listen(0, '127.0.0.1');
  let closing: Promise<void> | null = null;
  const close = () => (closing ??= app.close().then(() => rmSync(dataDir, { recursive: true })));
  return { app, server: app.getHttpServer() as Server, env, time, close };
}
