import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Logger } from '@nestjs/common';
import { QueryTypes, type Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { Database } from 'sqlite3';
import { StoreUnavailableError } from '../common/errors.js';
import { runStatement, selectRows } from './sql.js';
import { sqliteOptions } from './sqlite-options.js';
import { type BatchHandler, Writer, type WriterOptions } from './writer.js';

const insert = (transaction: Transaction, value: string): Promise<unknown> =>
  runStatement(transaction, 'INSERT INTO notes (value) VALUES (?)', value);

/** Writes a batch with one statement; `null` breaks the table's rule. */
class NotesHandler implements BatchHandler<string | null, string> {
  readonly batches: (string | null)[][] = [];
  async write(transaction: Transaction, items: readonly (string | null)[]): Promise<string[]> {
    this.batches.push([...items]);
    await runStatement(
      transaction,
      'INSERT INTO notes (value) SELECT value FROM json_each(?)',
      JSON.stringify(items),
    );
    return items.map((item) => `stored ${item}`);
  }
}

describe('Writer', () => {
  let dataDir: string;
  let sequelize: Sequelize;
  let writer: Writer;
  const options: WriterOptions = { queueLimit: 50, groupLimit: 10 };

  beforeAll(() => Logger.overrideLogger(false));
  beforeEach(async () => {
    dataDir = mkdtempSync(join(tmpdir(), 'ampkeep-writer-'));
    sequelize = new Sequelize(sqliteOptions(dataDir));
    await sequelize.query('CREATE TABLE notes (id INTEGER PRIMARY KEY, value TEXT NOT NULL UNIQUE) STRICT');
    await sequelize.query('CREATE TABLE links (note INTEGER REFERENCES notes (id)) STRICT');
    writer = new Writer(sequelize, options);
    await writer.onModuleInit();
  });
  afterEach(async () => {
    await writer.onApplicationShutdown();
    rmSync(dataDir, { recursive: true });
  });

  const stored = async (): Promise<string[]> => {
    const [rows] = await sequelize.query('SELECT value FROM notes ORDER BY id');
    return (rows as { value: string }[]).map(({ value }) => value);
  };
  /** COMMITs that the writer's connection ran so far, told by its own trace up to a marker. */
  async function countCommits(): Promise<() => Promise<number>> {
    const { transaction } = writer as unknown as { transaction: Transaction };
    const { connection } = transaction as unknown as { connection: Database };
    let commits = 0;
    let reachedMarker: () => void = () => undefined;
    connection.on('trace', (sql) => {
      if (sql.startsWith('COMMIT')) commits += 1;
      else if (sql.includes('marker')) reachedMarker();
    });
    const flush = async (): Promise<number> => {
      const reached = new Promise<void>((resolve) => (reachedMarker = resolve));
      await Promise.all([selectRows(transaction, `SELECT 'marker'`), reached]);
      return commits;
    };
    const before = await flush();
    return async () => (await flush()) - before;
  }

  it('commits all that waits together, in the order in which it came', async () => {
    const commits = await countCommits();
    await Promise.all(['a', 'b', 'c', 'd'].map((value) => writer.run((t) => insert(t, value))));
    expect(await commits()).toBe(1);
    expect(await stored()).toEqual(['a', 'b', 'c', 'd']);
  });

  it('commits groups of the largest size when more waits', async () => {
    const commits = await countCommits();
    await Promise.all(Array.from({ length: 25 }, (_, i) => writer.run((t) => insert(t, `n${i}`))));
    expect(await commits()).toBe(3);
    expect(await stored()).toHaveLength(25);
  });

  it('answers only when another connection can read what was written', async () => {
    await Promise.all(
      ['a', 'b', 'c'].map(async (value) => {
        await writer.run((t) => insert(t, value));
        expect(await stored()).toContain(value);
      }),
    );
  });

  it('lets a failing job fail alone, with its own error and without a trace of it', async () => {
    const jobs = [
      writer.run((t) => insert(t, 'a')),
      writer.run(async (t) => {
        await insert(t, 'half');
        throw new TypeError('second half missing');
      }),
      writer.run((t) => insert(t, 'a')),
      writer.run((t) => insert(t, 'z')),
    ];
    const settled = await Promise.allSettled(jobs);
    expect(settled.map(({ status }) => status)).toEqual(['fulfilled', 'rejected', 'rejected', 'fulfilled']);
    expect(settled[1]).toMatchObject({ reason: new TypeError('second half missing') });
    expect(settled[2]).toMatchObject({ reason: { code: 'SQLITE_CONSTRAINT' } });
    expect(await stored()).toEqual(['a', 'z']);
  });

  it('hands neighbouring items to their handler in one batch, each with its own outcome', async () => {
    const handler = new NotesHandler();
    const outcomes = await Promise.all(['a', 'b', 'c'].map((item) => writer.submit(handler, item)));
    expect(outcomes).toEqual(['stored a', 'stored b', 'stored c']);
    expect(handler.batches).toEqual([['a', 'b', 'c']]);
  });

  it('keeps the order between jobs and items', async () => {
    const handler = new NotesHandler();
    await Promise.all([
      writer.submit(handler, 'a'),
      writer.run((t) => insert(t, 'b')),
      writer.submit(handler, 'c'),
      writer.submit(handler, 'd'),
    ]);
    expect(await stored()).toEqual(['a', 'b', 'c', 'd']);
    expect(handler.batches).toEqual([['a'], ['c', 'd']]);
  });

  it('lets one bad item of a batch fail alone', async () => {
    const handler = new NotesHandler();
    const settled = await Promise.allSettled(['a', null, 'c'].map((item) => writer.submit(handler, item)));
    expect(settled.map(({ status }) => status)).toEqual(['fulfilled', 'rejected', 'fulfilled']);
    expect(await stored()).toEqual(['a', 'c']);
  });

  it('refuses more than may wait, and stores the others', async () => {
    const settled = await Promise.allSettled(
      Array.from({ length: 60 }, (_, i) => writer.run((t) => insert(t, `n${i}`))),
    );
    const refused = settled.filter(({ status }) => status === 'rejected');
    expect(refused).toHaveLength(10);
    for (const outcome of refused) {
      expect(outcome).toMatchObject({ reason: { status: 503, retryAfterSeconds: expect.any(Number) } });
    }
    expect(await stored()).toHaveLength(50);
    await writer.run((t) => insert(t, 'later'));
  });

  it('refuses a whole group that cannot be committed, stores nothing of it, and goes on', async () => {
    const dangling = async (t: Transaction): Promise<void> => {
      await runStatement(t, 'PRAGMA defer_foreign_keys = ON');
      await runStatement(t, 'INSERT INTO links (note) VALUES (4711)');
    };
    const settled = await Promise.allSettled([writer.run((t) => insert(t, 'a')), writer.run(dangling)]);
    for (const outcome of settled)
      expect(outcome).toMatchObject({ reason: expect.any(StoreUnavailableError) });
    expect(await stored()).toEqual([]);
    await writer.run((t) => insert(t, 'b'));
    expect(await stored()).toEqual(['b']);
  });

  it('recovers when the store had no room', async () => {
    const { transaction } = writer as unknown as { transaction: Transaction };
    await runStatement(transaction, 'PRAGMA max_page_count = 4');
    const large = 'x'.repeat(20_000);
    const settled = await Promise.allSettled([
      writer.run((t) => insert(t, 'small')),
      writer.run((t) => insert(t, large)),
    ]);
    expect(settled[1]).toMatchObject({ reason: expect.any(StoreUnavailableError) });
    const kept = settled[0].status === 'fulfilled' ? ['small'] : [];
    expect(await stored()).toEqual(kept);
    await runStatement(transaction, 'PRAGMA max_page_count = 100000');
    await writer.run((t) => insert(t, large));
    expect(await stored()).toEqual([...kept, large]);
  });

  it('writes what waits before it closes, and refuses what comes after', async () => {
    const waiting = writer.run((t) => insert(t, 'a'));
    const closing = writer.onApplicationShutdown();
    await expect(writer.run((t) => insert(t, 'b'))).rejects.toThrow(StoreUnavailableError);
    await Promise.all([waiting, closing]);
    const reader = new Sequelize(sqliteOptions(dataDir));
    const [rows] = await reader.query('SELECT value FROM notes');
    await reader.close();
    expect(rows).toEqual([{ value: 'a' }]);
  });

  it('has pragmas that survive a power cut on its own and on every other connection', async () => {
    const pragmas = ['journal_mode', 'synchronous', 'foreign_keys', 'busy_timeout'];
    const wanted = ['wal', 2, 1, 5000];
    const own = await writer.run((t) =>
      Promise.all(pragmas.map((name) => selectRows<Record<string, unknown>>(t, `PRAGMA ${name}`))),
    );
    expect(own.map(([row]) => Object.values(row!)[0])).toEqual(wanted);
    const onReader = await Promise.all(
      pragmas.map((name) =>
        sequelize.query<object>(`SELECT * FROM pragma_${name}`, { type: QueryTypes.SELECT }),
      ),
    );
    expect(onReader.map(([row]) => Object.values(row!)[0])).toEqual(wanted);
    await sequelize.transaction(async (transaction) => {
      for (const [index, name] of pragmas.entries()) {
        const [row] = await selectRows<Record<string, unknown>>(transaction, `PRAGMA ${name}`);
        expect(Object.values(row!)[0]).toBe(wanted[index]);
      }
    });
  });
});
