import { existsSync } from 'node:fs';
import { rm } from 'node:fs/promises';
import { join } from 'node:path';
import { databaseFile, sqliteOptions } from '@ampkeep/ingest-api/dist/database/sqlite-options.js';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';

/**
 * `none`: no database or nothing in it; `unfinished`: seeding was broken off; `demo`: seeded;
 * `foreign`: somebody's real data.
 */
export type DatabaseState = 'none' | 'unfinished' | 'demo' | 'foreign';

/** Name of the setting that tells since when the demonstration is complete. */
export const SEEDED_AT = 'demoSeededAt';

/** Thrown for a database that must not be touched, or not now; the message says what to do. */
export class DemoDatabaseError extends Error {
  override readonly name = 'DemoDatabaseError';
}

/** Looks into a database without changing it. */
export async function inspectDatabase(dataDir: string): Promise<DatabaseState> {
  if (!existsSync(databaseFile(dataDir))) return 'none';
  return withConnection(dataDir, async (sequelize) => {
    const tables = new Set(await names(sequelize, `SELECT name FROM sqlite_master WHERE type = 'table'`));
    const count = async (table: string, where = '') => {
      if (!tables.has(table)) return 0;
      return (await names(sequelize, `SELECT 1 AS name FROM ${table} ${where} LIMIT 1`)).length;
    };
    const hasPeople = (await count('users')) > 0;
    const hasRealPeople = (await count('users', 'WHERE demo = 0')) > 0;
    const hasContent = (await count('products')) + (await count('results')) > 0;
    if (hasRealPeople || (hasContent && !hasPeople)) return 'foreign';
    if (!hasPeople) return 'none';
    return (await count('settings', `WHERE name = '${SEEDED_AT}'`)) > 0 ? 'demo' : 'unfinished';
  });
}

/**
 * Removes a demo database and what belongs to it.
 * @throws DemoDatabaseError when it isn't a demo's or a server still works with it
 */
export async function removeDemoDatabase(dataDir: string): Promise<void> {
  if ((await inspectDatabase(dataDir)) === 'foreign') throw foreignDatabase(dataDir);
  const file = databaseFile(dataDir);
  if (existsSync(file)) await withConnection(dataDir, refuseIfInUse);
  for (const name of [file, `${file}-wal`, `${file}-shm`]) await rm(name, { force: true });
  for (const name of ['mailbox', 'station-keys.json', 'station-sim.spool.ndjson']) {
    await rm(join(dataDir, name), { force: true, recursive: true });
  }
}

export function foreignDatabase(dataDir: string): DemoDatabaseError {
  return new DemoDatabaseError(
    `The database in ${dataDir} is not the demonstration's: nothing was changed. ` +
      'Set AMPKEEP_DATA_DIR to another folder, or leave it out for data/demo.',
  );
}

/** Leaving write-ahead mode needs the database for oneself; the next to open it enters that mode again. */
async function refuseIfInUse(sequelize: Sequelize): Promise<void> {
  await sequelize.query('PRAGMA busy_timeout = 200');
  const [mode] = await names(sequelize, 'PRAGMA journal_mode = DELETE').catch(() => ['busy']);
  if (mode === 'delete') return;
  throw new DemoDatabaseError('A running Ampkeep uses this database. Stop it first.');
}

async function withConnection<T>(dataDir: string, work: (sequelize: Sequelize) => Promise<T>): Promise<T> {
  const sequelize = new Sequelize(sqliteOptions(dataDir));
  try {
    return await work(sequelize);
  } finally {
    await sequelize.close();
  }
}

async function names(sequelize: Sequelize, sql: string): Promise<string[]> {
  const rows = await sequelize.query<Record<string, string>>(sql, { type: QueryTypes.SELECT });
  return rows.map((row) => String(Object.values(row)[0]));
}
