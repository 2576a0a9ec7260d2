import 'reflect-metadata';
import { parseArgs } from 'node:util';
import { BadSettingsError } from '@ampkeep/ingest-api/dist/config/env.js';
import { NewerDatabaseError } from '@ampkeep/ingest-api/dist/database/migrator.js';
import {
  DemoDatabaseError,
  foreignDatabase,
  inspectDatabase,
  removeDemoDatabase,
} from './database/demo-database.js';
import { demoEnv } from './demo-settings.js';
import { seedDatabase } from './seed-database.js';

const help = `Loads the demonstration into its own database (data/demo, or AMPKEEP_DATA_DIR).

  npm run seed              into an empty database
  npm run seed -- --fresh   removes the demonstration that is there and loads it anew

Any database that is not the demonstration's is refused.
`;

async function seed(fresh: boolean): Promise<void> {
  const started = Date.now();
  const env = demoEnv(process.env);
  const state = await inspectDatabase(env.dataDir);
  if (state === 'foreign') throw foreignDatabase(env.dataDir);
  if (state !== 'none' && !fresh) {
    throw new DemoDatabaseError(
      `The database in ${env.dataDir} holds the demonstration already. Use --fresh to load it anew.`,
    );
  }
  if (fresh) await removeDemoDatabase(env.dataDir);
  await seedDatabase({ env, now: new Date(), report: (line) => console.log(line) });
  console.log(`Loaded into ${env.dataDir} in ${((Date.now() - started) / 1000).toFixed(1)} s`);
}

async function main(): Promise<void> {
  const { values } = parseArgs({
    options: { fresh: { type: 'boolean', default: false }, help: { type: 'boolean', short: 'h' } },
  });
  if (values.help) process.stdout.write(help);
  else await seed(values.fresh);
}

main().catch((error: unknown) => {
  const expected =
    error instanceof DemoDatabaseError ||
    error instanceof BadSettingsError ||
    error instanceof NewerDatabaseError;
  const unknownOption = error instanceof TypeError && 'code' in error;
  console.error(expected || unknownOption ? error.message : error);
  process.exitCode = unknownOption ? 2 : 1;
});
