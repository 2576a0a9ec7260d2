import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Sequelize } from 'sequelize-typescript';
import { readEnv } from '../src/config/env.js';
import { createApp } from '../src/create-app.js';
import { migrations } from '../src/database/migrations/migration-list.js';
import { createMigrator, NewerDatabaseError } from '../src/database/migrator.js';
import { models } from '../src/database/models.js';
import { prepareDatabase } from '../src/database/prepare-database.js';
import { runScript } from '../src/database/run-script.js';
import { databaseFile, sqliteOptions } from '../src/database/sqlite-options.js';
import { aFailingResult } from './builders.js';
import { createTestApp } from './create-test-app.js';

describe('migrations', () => {
  let dataDir: string;
  beforeEach(() => (dataDir = mkdtempSync(join(tmpdir(), 'ampkeep-migrations-'))));
  afterEach(() => rmSync(dataDir, { recursive: true }));
  const names = migrations.map(({ name }) => name);

  async function withDatabase<T>(folder: string, use: (sequelize: Sequelize) => Promise<T>): Promise<T> {
    const sequelize = new Sequelize(sqliteOptions(folder));
    try {
      return await use(sequelize);
    } finally {
      await sequelize.close();
    }
  }
  const tables = async (sequelize: Sequelize): Promise<string[]> => {
    const [rows] = await sequelize.query(
      `SELECT name FROM sqlite_schema WHERE type IN ('table', 'trigger', 'index') AND name NOT LIKE 'sqlite_%' ORDER BY name`,
    );
    return (rows as { name: string }[]).map(({ name }) => name);
  };

  it('make a database out of nothing, once', async () => {
    const folder = join(dataDir, 'new', 'site');
    expect(await prepareDatabase(folder)).toEqual(names);
    expect(existsSync(databaseFile(folder))).toBe(true);
    expect(await prepareDatabase(folder)).toEqual([]);
  });

  it('make every table and column that a model names', async () => {
    await prepareDatabase(dataDir);
    await withDatabase(dataDir, async (sequelize) => {
      sequelize.addModels(models);
      for (const model of models) {
        const [columns] = await sequelize.query(`PRAGMA table_info(${model.getTableName() as string})`);
        const existing = (columns as { name: string }[]).map(({ name }) => name);
        const wanted = Object.values(model.getAttributes()).map(({ field }) => field);
        expect(existing).toEqual(expect.arrayContaining(wanted));
      }
    });
  });

  it('are named in the order in which they run', () => {
    expect(names).toEqual([...names].sort());
    expect(new Set(names).size).toBe(names.length);
  });

  it('can be taken back one by one from a database that holds results, and run again', async () => {
    const test = await createTestApp();
    await test.post(aFailingResult()).expect(201);
    await test.post('{').expect(400);
    await withDatabase(test.env.dataDir, (sequelize) =>
      sequelize.query(`VACUUM INTO '${databaseFile(dataDir)}'`),
    );
    await test.close();
    await withDatabase(dataDir, async (sequelize) => {
      const before = await tables(sequelize);
      const migrator = createMigrator(sequelize);
      for (const name of [...names].reverse()) {
        expect((await migrator.down()).map((undone) => undone.name)).toEqual([name]);
      }
      expect(await tables(sequelize)).toEqual(['schema_changes']);
      await migrator.up();
      expect(await tables(sequelize)).toEqual(before);
    });
  });

  it('refuse a database of a newer version, in words, and leave it alone', async () => {
    await prepareDatabase(dataDir);
    await withDatabase(dataDir, (sequelize) =>
      sequelize.query(`INSERT INTO schema_changes (name) VALUES ('20991231T2359-invent-something')`),
    );
    const attempt = prepareDatabase(dataDir);
    await expect(attempt).rejects.toThrow(NewerDatabaseError);
    await expect(attempt).rejects.toThrow(/newer Ampkeep.*20991231T2359-invent-something.*restore a backup/);
    const env = readEnv({ AMPKEEP_MODE: 'demo', AMPKEEP_DATA_DIR: dataDir, AMPKEEP_LOG_LEVEL: 'silent' });
    await expect(createApp(env)).rejects.toThrow(NewerDatabaseError);
  });

  it('keep all or nothing of a change that breaks off', async () => {
    await withDatabase(dataDir, async (sequelize) => {
      const broken = createMigrator(sequelize, [
        {
          name: '20270101T0000-broken',
          up: (context) => runScript(context, ['CREATE TABLE one (a)', 'CREATE TABLE one (a)']),
          down: (context) => runScript(context, ['DROP TABLE one']),
        },
      ]);
      await expect(broken.up()).rejects.toThrow(/one/);
      expect(await tables(sequelize)).toEqual(['schema_changes']);
    });
  });
});
