import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Logger } from 'nestjs-pino';
import { AppModule } from './app.module.js';
import type { Clock } from './config/config.module.js';
import type { Env } from './config/env.js';
import { configureApp } from './configure-app.js';
import { prepareDatabase } from './database/prepare-database.js';
import { serveDashboard } from './docs/serve-dashboard.js';
import { serveDocs } from './docs/serve-docs.js';

/** The whole server, ready to listen. */
export async function createApp(env: Env, clock: Clock = Date.now): Promise<NestExpressApplication> {
  await prepareDatabase(env.dataDir);
  const app = await NestFactory.create<NestExpressApplication>(AppModule.for(env, clock), {
    bodyParser: false,
    bufferLogs: true,
  });
  app.useLogger(app.get(Logger));
  configureApp(app);
  serveDocs(app);
  serveDashboard(app);
  return app;
}
