import type { Env } from '@ampkeep/ingest-api/dist/config/env.js';
import { createApp } from '@ampkeep/ingest-api/dist/create-app.js';
import { prepareDatabase } from '@ampkeep/ingest-api/dist/database/prepare-database.js';
import { foreignDatabase, inspectDatabase, removeDemoDatabase } from '../database/demo-database.js';
import { hasStationKeys, stationKeys } from '../database/station-keys.js';
import { seedDatabase } from '../seed-database.js';

/**
 * Leaves a migrated, seeded database with keys for the simulated stations; what is there already is kept.
 * @throws DemoDatabaseError for a database that isn't the demonstration's
 */
export async function prepareDemoDatabase(env: Env, report: (line: string) => void): Promise<void> {
  const state = await inspectDatabase(env.dataDir);
  if (state === 'foreign') throw foreignDatabase(env.dataDir);
  if (state === 'demo') {
    await prepareDatabase(env.dataDir);
    if (!hasStationKeys(env.dataDir)) await renewStationKeys(env);
    return;
  }
  if (state === 'unfinished') await removeDemoDatabase(env.dataDir);
  report('Loading the demonstration (once):');
  await seedDatabase({ env, now: new Date(), report: (line) => report(`  ${line}`) });
}

async function renewStationKeys(env: Env): Promise<void> {
  const app = await createApp(env);
  try {
    await app.init();
    await stationKeys(app, env.dataDir);
  } finally {
    await app.close();
  }
}
