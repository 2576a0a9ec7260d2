import { mkdirSync } from 'node:fs';
import { Sequelize } from 'sequelize-typescript';
import { migrate } from './migrator.js';
import { sqliteOptions } from './sqlite-options.js';

/**
 * Creates the database if there is none and brings its schema up to this version, before anything reads it.
 * @throws NewerDatabaseError when it was written by a newer Ampkeep.
 */
export async function prepareDatabase(dataDir: string): Promise<string[]> {
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  const sequelize = new Sequelize(sqliteOptions(dataDir));
  try {
    return await migrate(sequelize);
  } finally {
    await sequelize.close();
  }
}
