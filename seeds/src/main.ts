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
import { demoHistory } from './history/build-history.js';
import { seedDatabase } from './seed-database.js';

const help = `Loads the demonstration into its own database (data/demo, or AMPKEEP_DATA_DIR).

  npm run seed              into an empty database
  npm run seed -- --fresh   removes the demonstration that is there and loads it anew

  --days N     length of the history, 1 to 120 days         (${demoHistory.days})
  --end TIME   where the history ends, ISO 8601              (now)
  --seed TEXT  same seed, end and days: same history         (${demoHistory.seed})

Any database that is not the demonstration's is refused.
`;

interface Wanted {
  fresh: boolean;
  days: number;
  now: Date;
  seed: string;
}

async function load({ fresh, ...history }: Wanted): Promise<void> {
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
  await seedDatabase({ env, ...history, report: (line) => console.log(line) });
  console.log(`Loaded into ${env.dataDir} in ${((Date.now() - started) / 1000).toFixed(1)} s`);
}

async function main(): Promise<void> {
  const { values } = parseArgs({
    options: {
      fresh: { type: 'boolean', default: false },
      days: { type: 'string', default: String(demoHistory.days) },
      end: { type: 'string' },
      seed: { type: 'string', default: demoHistory.seed },
      help: { type: 'boolean', short: 'h' },
    },
  });
  if (values.help) process.stdout.write(help);
  else
    await load({ fresh: values.fresh, days: daysOf(values.days), now: endOf(values.end), seed: values.seed });
}

function daysOf(text: string): number {
  const days = Number(text);
  if (Number.isInteger(days) && days >= 1 && days <= 120) return days;
  throw new UsageError(`--days is "${text}", must be a whole number from 1 to 120`);
}

/** A history can't end in the future: the intake refuses what was measured after it is received. */
function endOf(text: string | undefined): Date {
  const now = new Date();
  const end = text === undefined ? now : new Date(text);
  if (end <= now) return end;
  throw new UsageError(`--end is "${text}", must be a time such as 2026-12-01T14:30:00Z, not in the future`);
}

/** Thrown for a command line that can't be carried out. */
class UsageError extends Error {}

main().catch((error: unknown) => {
  const expected =
    error instanceof DemoDatabaseError ||
    error instanceof BadSettingsError ||
    error instanceof NewerDatabaseError;
  const usage = error instanceof UsageError || (error instanceof TypeError && 'code' in error);
  console.error(expected || usage ? error.message : error);
  process.exitCode = usage ? 2 : 1;
});
