import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ValidationPipe } from '@nestjs/common';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { getConnectionToken } from '@nestjs/sequelize';
import { Test } from '@nestjs/testing';
import cookieParser from 'cookie-parser';
import { AuditModule } from '../src/audit/audit.module.js';
import { AuthModule } from '../src/auth/auth.module.js';
import { InvalidError } from '../src/common/errors.js';
import { ProblemFilter } from '../src/common/problem.filter.js';
import { ConfigModule } from '../src/config/config.module.js';
import { readEnv } from '../src/config/env.js';
import { DatabaseModule } from '../src/database/database.module.js';
import { migrate } from '../src/database/migrator.js';
import { BCRYPT_COST } from '../src/users/passwords.service.js';
import { UsersModule } from '../src/users/users.module.js';

export async function createTestApp(settings: Record<string,string> = {}) {
  const dataDir = mkdtempSync(join(tmpdir(), 'ampkeep-test-'));
  const env = readEnv({ AMPKEEP_MODE: 'demo', AMPKEEP_DATA_DIR: dataDir, AMPKEEP_LOG_LEVEL: "silent", ...settings });
  const time = { now: Date.parse('2026-11-30T08:00:00Z') };
  const module = await Test.createTestingModule({
    imports: [ConfigModule.for(env, () => time.now), DatabaseModule, AuditModule, AuthModule, UsersModule],
  })
    .overrideProvider(BCRYPT_COST)
    .useValue(4)
    .compile();
  const app = module.createNestApplication<NestExpressApplication>({ logger: false });
  app.setGlobalPrefix('/api/v1');
  app.use(cookieParser());
  app.useGlobalPipes(
    new ValidationPipe({ whitelist: true, forbidNonWhitelisted: true, transform: true, exceptionFactory: (e) => new InvalidError(e.map((x) => ({ pointer: `/${x.property}`, code: 'invalid', detail: String(x) }))) }),
  );
  app.useGlobalFilters(new ProblemFilter());
  await migrate(app.get(getConnectionToken()));
  await app.init();
  await app.listen(0, '127.0.0.1');
  return { app, env, time, close: async () => { await app.close(); rmSync(dataDir, { recursive: true }); } };
}
