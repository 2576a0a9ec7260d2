import { mkdtemp, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readEnv } from '@ampkeep/ingest-api/dist/config/env.js';
import { databaseFile, sqliteOptions } from '@ampkeep/ingest-api/dist/database/sqlite-options.js';
import { productByPartNumber, stageOf } from '@ampkeep/station-sim/dist/circuit/products.js';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inspectDatabase, removeDemoDatabase } from './database/demo-database.js';
import { stationKeyFile } from './database/station-keys.js';
import { buildHistory, demoHistory } from './history/build-history.js';
import { historyGroups } from './history/history-groups.js';
import { judgePost } from './history/judge-post.js';
import { seedDatabase } from './seed-database.js';

const now = new Date('2026-12-01T14:30:00Z');
const days = 1;
let dataDir: string;
const lines: string[] = [];

beforeAll(async () => {
  dataDir = await mkdtemp(join(tmpdir(), 'ampkeep-seeds-'));
  const env = readEnv({
    AMPKEEP_MODE: 'demo',
    AMPKEEP_DATA_DIR: dataDir,
    AMPKEEP_PORT: '0',
    AMPKEEP_LOG_LEVEL: 'silent',
  });
  await seedDatabase({ env, now, days, makeHistory: historyGroups, report: (line) => lines.push(line) });
}, 120_000);

afterAll(() => rm(dataDir, { recursive: true }));

async function rows<Row extends object>(sql: string): Promise<Row[]> {
  const sequelize = new Sequelize(sqliteOptions(dataDir));
  try {
    return await sequelize.query<Row>(sql, { type: QueryTypes.SELECT });
  } finally {
    await sequelize.close();
  }
}

describe('a seeded database', () => {
  it('holds the whole history, judged as it was foretold', async () => {
    const history = [...buildHistory({ ...demoHistory, days, now }, judgePost)];
    const stored = await rows<{ uuid: string; verdict: string }>(
      'SELECT result_uuid AS uuid, verdict FROM results',
    );
    const verdicts = new Map(stored.map(({ uuid, verdict }) => [uuid, verdict]));
    expect(stored).toHaveLength(history.length);
    for (const { post } of history) {
      const product = productByPartNumber(post.partNumber);
      const stage = stageOf(product, post.stage as 'board' | 'final');
      expect(verdicts.get(post.resultId)).toBe(judgePost(post, product, stage));
    }
  });

  it('holds no oddities but those of the stories', async () => {
    const flagged = await rows<{ flags: string }>('SELECT DISTINCT flags FROM results');
    const flags = new Set(flagged.flatMap((row) => JSON.parse(row.flags) as string[]));
    for (const odd of [
      'planOutdated',
      'supersededLimits',
      'clockSkew',
      'instrumentMismatch',
      'loadAboveSupply',
    ]) {
      expect(flags).not.toContain(odd);
    }
  });

  it('opened breaches and wrote no mail', async () => {
    expect((await rows('SELECT 1 FROM breaches')).length).toBeGreaterThan(0);
    expect(await rows('SELECT 1 FROM outbox')).toEqual([]);
  });

  it('has one demo account for each role, and refused posts to look at', async () => {
    const roles = await rows<{ role: string }>('SELECT role FROM users WHERE demo = 1 ORDER BY role');
    expect(roles.map(({ role }) => role)).toEqual([
      'administrator',
      'integrator',
      'productionEngineer',
      'qualityLead',
      'viewer',
    ]);
    expect(await rows('SELECT 1 FROM refused_posts')).toHaveLength(1);
  });

  it('keeps the stations’ keys to its owner', async () => {
    expect((await stat(stationKeyFile(dataDir))).mode & 0o777).toBe(0o600);
  });

  it('told how far it was', () => {
    expect(lines.at(-1)).toMatch(/^ {2}\d+ results$/);
  });
});

describe('telling databases apart', () => {
  it('knows the demonstration’s, and nothing where there is nothing', async () => {
    expect(await inspectDatabase(dataDir)).toBe('demo');
    expect(await inspectDatabase(join(dataDir, 'elsewhere'))).toBe('none');
  });

  it('leaves a database alone that somebody else works in', async () => {
    const copy = await mkdtemp(join(tmpdir(), 'ampkeep-seeds-'));
    try {
      const sequelize = new Sequelize(sqliteOptions(copy));
      await sequelize.query('CREATE TABLE users (email TEXT, demo INTEGER)');
      await sequelize.query(`INSERT INTO users VALUES ('someone@real.example', 0)`);
      await sequelize.close();
      expect(await inspectDatabase(copy)).toBe('foreign');
      await expect(removeDemoDatabase(copy)).rejects.toThrow("is not the demonstration's");
      expect((await stat(databaseFile(copy))).size).toBeGreaterThan(0);
    } finally {
      await rm(copy, { recursive: true });
    }
  });

  it('does not remove a demonstration that a server uses', async () => {
    const copy = await mkdtemp(join(tmpdir(), 'ampkeep-seeds-'));
    const server = new Sequelize(sqliteOptions(copy));
    try {
      await server.query('CREATE TABLE users (email TEXT, demo INTEGER)');
      await expect(removeDemoDatabase(copy)).rejects.toThrow('Stop it first');
      await server.close();
      await removeDemoDatabase(copy);
      expect(await inspectDatabase(copy)).toBe('none');
    } finally {
      await rm(copy, { recursive: true });
    }
  });
});
