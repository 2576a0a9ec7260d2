import { join } from 'node:path';
import sqlite3 from 'sqlite3';
import type { SequelizeOptions } from 'sequelize-typescript';

/** WAL so that readers never wait for the writer; FULL so that a 2xx survives a power cut. */
const openingPragmas = `
  PRAGMA busy_timeout = 5000;
  PRAGMA journal_mode = WAL;
  PRAGMA synchronous = FULL;
  PRAGMA foreign_keys = ON;
`;

type OpenCallback = (this: sqlite3.Database, error: Error | null) => void;

/**
 * A database handle that sets its pragmas before anyone may use it. Sequelize's own `afterConnect`
 * hook never fires for SQLite, and each of its connections must have them.
 */
class PreparedDatabase extends sqlite3.Database {
  constructor(filename: string, mode: number, callback: OpenCallback) {
    super(filename, mode, function (this: sqlite3.Database, error) {
      if (error) callback.call(this, error);
      else this.exec(openingPragmas, (failed) => callback.call(this, failed));
    });
  }

  override all(sql: string, ...rest: unknown[]): this {
    return super.all(readToTheEnd(sql), ...(rest as []));
  }

  override run(sql: string, ...rest: unknown[]): this {
    return super.run(readToTheEnd(sql), ...(rest as []));
  }
}

/**
 * SQLite reads a statement up to its first NUL. Sequelize writes texts into its conditions as they are, so a NUL that
 * somebody sent stands inside a quoted text: it is put in by function.
 */
const readToTheEnd = (sql: string): string => sql.replaceAll('\u0000', `'||char(0)||'`);

export const databaseFile = (dataDir: string): string => join(dataDir, 'ampkeep.sqlite');

/** Sequelize's options for one database file; the schema belongs to the migrations alone. */
export function sqliteOptions(dataDir: string): SequelizeOptions {
  return {
    dialect: 'sqlite',
    dialectModule: { ...sqlite3, Database: PreparedDatabase },
    storage: databaseFile(dataDir),
    logging: false,
    define: { underscored: true, timestamps: false },
  };
}
