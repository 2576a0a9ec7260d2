import type { QueryInterface } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import { SequelizeStorage, Umzug } from 'umzug';
import { migrations } from './migrations/migration-list.js';

export interface Migration {
  name: string;
  up: (context: QueryInterface) => Promise<void>;
  down: (context: QueryInterface) => Promise<void>;
}

/** Thrown when the database was written by a newer Ampkeep than this one. */
export class NewerDatabaseError extends Error {
  constructor(unknown: readonly string[]) {
    super(
      `This database was written by a newer Ampkeep (it holds the change "${unknown.at(-1)}" that this version doesn't know). ` +
        'Start the newer version, or restore a backup from before the upgrade. Nothing was changed.',
    );
    this.name = 'NewerDatabaseError';
  }
}

const storageOf = (sequelize: Sequelize): SequelizeStorage =>
  new SequelizeStorage({ sequelize, tableName: 'schema_changes' });

export function createMigrator(
  sequelize: Sequelize,
  list: readonly Migration[] = migrations,
): Umzug<QueryInterface> {
  return new Umzug<QueryInterface>({
    migrations: list.map(({ name, up, down }) => ({
      name,
      up: ({ context }) => up(context),
      down: ({ context }) => down(context),
    })),
    context: sequelize.getQueryInterface(),
    storage: storageOf(sequelize),
    logger: undefined,
  });
}

/**
 * Brings the schema up to this version.
 * @throws NewerDatabaseError when the database is ahead of this version.
 */
export async function migrate(sequelize: Sequelize): Promise<string[]> {
  const known = new Set(migrations.map((migration) => migration.name));
  // Asked of the table itself: the migrator's own list leaves out what it doesn't know.
  const unknown = (await storageOf(sequelize).executed()).filter((name) => !known.has(name));
  if (unknown.length > 0) throw new NewerDatabaseError(unknown);
  return (await createMigrator(sequelize).up()).map((done) => done.name);
}
