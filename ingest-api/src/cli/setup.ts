import 'reflect-metadata';
import { readFileSync } from 'node:fs';
import { AmpkeepError } from '../common/errors.js';
import { BadSettingsError, readEnv } from '../config/env.js';
import { loadEnvFile } from '../config/load-env-file.js';
import { createApp } from '../create-app.js';
import { SiteSetupService } from '../site-setup/site-setup.service.js';
import { AccountsNotReadyError, refuseDemoAccounts } from '../users/first-administrator.js';

/** `npm run setup -- site.json`: adds products, stages, plans, first limits and stations to the site's database. */
async function main(file: string | undefined): Promise<void> {
  if (file === undefined) {
    console.error('Usage: npm run setup -- site.json   (README describes the file)');
    process.exitCode = 2;
    return;
  }
  const description = JSON.parse(readFileSync(file, 'utf8')) as unknown;
  loadEnvFile();
  const env = readEnv({ AMPKEEP_LOG_LEVEL: 'error', ...process.env });
  const app = await createApp(env);
  try {
    await app.init();
    await refuseDemoAccounts(env);
    const report = await app.get(SiteSetupService, { strict: false }).apply(description, 'setup');
    for (const line of report) console.log(line);
  } finally {
    await app.close();
  }
}

main(process.argv[2]).catch((error: unknown) => {
  if (error instanceof AmpkeepError) {
    console.error(error.message);
    for (const { pointer, detail } of error.errors) console.error(`  ${pointer || '/'}: ${detail}`);
  } else if (
    error instanceof BadSettingsError ||
    error instanceof AccountsNotReadyError ||
    error instanceof SyntaxError
  )
    console.error(error.message);
  else console.error(error);
  process.exitCode = 1;
});
