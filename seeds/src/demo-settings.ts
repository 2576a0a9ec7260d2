import { join } from 'node:path';
import { type Env, readEnv } from '@ampkeep/ingest-api/dist/config/env.js';

/** Top of the repository; this file runs from seeds/dist. */
export const repositoryRoot = join(__dirname, '..', '..');

/** The environment variables with which the server runs as the demonstration. */
export function demoVariables(source: NodeJS.ProcessEnv): Record<string, string> {
  const port = source.AMPKEEP_PORT ?? source.PORT ?? '4780';
  return {
    AMPKEEP_MODE: 'demo',
    AMPKEEP_HOST: '127.0.0.1',
    AMPKEEP_PORT: port,
    AMPKEEP_PUBLIC_URL: `http://localhost:${port}`,
    AMPKEEP_DATA_DIR: source.AMPKEEP_DATA_DIR ?? join(repositoryRoot, 'data', 'demo'),
    AMPKEEP_LOG_LEVEL: source.AMPKEEP_LOG_LEVEL ?? 'warn',
  };
}

/** @throws BadSettingsError listing every bad setting */
export const demoEnv = (source: NodeJS.ProcessEnv): Env => readEnv(demoVariables(source));
