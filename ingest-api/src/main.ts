import 'reflect-metadata';
import type { Server } from 'node:http';
import { BadSettingsError, type Env, readEnv } from './config/env.js';
import { loadEnvFile } from './config/load-env-file.js';
import { createApp } from './create-app.js';
import { NewerDatabaseError } from './database/migrator.js';
import {
  AccountsNotReadyError,
  FirstAdministrator,
  refuseDemoAccounts,
} from './users/first-administrator.js';

/** A station that dribbles its body in is cut off after this long. */
const SLOWEST_REQUEST_MS = 30_000;

async function serve(env: Env): Promise<void> {
  const app = await createApp(env);
  await app.init();
  await refuseDemoAccounts(env);
  await app.get(FirstAdministrator, { strict: false }).createOnce();
  const server: Server = app.getHttpServer();
  server.requestTimeout = SLOWEST_REQUEST_MS;
  server.headersTimeout = 10_000;
  await app.listen(env.port, env.host);
  const address = server.address();
  const port = typeof address === 'object' && address !== null ? address.port : env.port;
  // Read by whatever started this process, so it goes out plainly besides the log.
  console.log(`Ampkeep listens on http://${env.host}:${port}`);
}

async function main(): Promise<void> {
  try {
    loadEnvFile();
    await serve(readEnv(process.env));
  } catch (error) {
    const expected =
      error instanceof BadSettingsError ||
      error instanceof NewerDatabaseError ||
      error instanceof AccountsNotReadyError;
    console.error(expected ? error.message : error);
    process.exit(1);
  }
}

void main();
