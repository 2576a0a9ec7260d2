import { Inject, Injectable, Logger, type OnApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { StoreUnavailableError } from '../common/errors.js';
import { runStatement } from './sql.js';

/** A job of its own: runs inside a savepoint, so its failure undoes only itself. */
export type WriteWork<T> = (transaction: Transaction) => Promise<T>;

/** Stores many items with few statements. `write` gives one outcome per item, in order. */
export interface BatchHandler<Item, Outcome> {
  write(transaction: Transaction, items: readonly Item[]): Promise<Outcome[]>;
}

interface Job {
  handler: BatchHandler<unknown, unknown> | null;
  item: unknown;
  work: WriteWork<unknown> | null;
  resolve: (outcome: unknown) => void;
  reject: (error: unknown) => void;
}

type Settlement = { job: Job; outcome?: unknown; error?: unknown };

export const WRITER_OPTIONS = Symbol('WRITER_OPTIONS');
export interface WriterOptions {
  /** Jobs that may wait; beyond it callers get StoreUnavailableError (503). */
  queueLimit: number;
  /** Jobs committed together at most. */
  groupLimit: number;
}

/**
 * The only way into the database. Everything queued while one commit runs is committed together by the
 * next (group commit): one fsync serves them all, and no two writers ever wait for each other's lock.
 * A promise resolves only after its commit.
 */
@Injectable()
export class Writer implements OnModuleInit, OnApplicationShutdown {
  private readonly logger = new Logger(Writer.name);
  private readonly queue: Job[] = [];
  private transaction!: Transaction;
  private draining: Promise<void> | null = null;
  private closed = false;

  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    @Inject(WRITER_OPTIONS) private readonly options: WriterOptions,
  ) {}

  async onModuleInit(): Promise<void> {
    // One connection that nobody else uses, dressed as a Sequelize transaction so that models accept it.
    const connection = await this.sequelize.connectionManager.getConnection({
      type: 'write',
      uuid: 'writer',
    } as never);
    const Ctor = Transaction as unknown as new (sequelize: Sequelize, options: object) => Transaction;
    this.transaction = Object.assign(new Ctor(this.sequelize, {}), { connection });
  }

  /** Runs `work` in the next group commit. Pass the transaction on to every model call: `{ transaction }`. */
  run<T>(work: WriteWork<T>): Promise<T> {
    return this.enqueue({ handler: null, item: null, work }) as Promise<T>;
  }

  /** Hands an item to its handler together with all others of the same handler that wait. */
  submit<Item, Outcome>(handler: BatchHandler<Item, Outcome>, item: Item): Promise<Outcome> {
    return this.enqueue({
      handler: handler,
      item,
      work: null,
    }) as Promise<Outcome>;
  }

  /** Last of all, when no request is under way any more: writes what waits and closes the database. */
  async onApplicationShutdown(): Promise<void> {
    if (this.closed) return;
    this.closed = true;
    await this.draining;
    await this.sequelize.close();
  }

  private enqueue(job: Pick<Job, 'handler' | 'item' | 'work'>): Promise<unknown> {
    if (this.closed || this.queue.length >= this.options.queueLimit) {
      return Promise.reject(new StoreUnavailableError(1));
    }
    return new Promise((resolve, reject) => {
      this.queue.push({ ...job, resolve, reject });
      this.draining ??= this.drain();
    });
  }

  private async drain(): Promise<void> {
    await Promise.resolve();
    while (this.queue.length > 0) await this.commitGroup(this.queue.splice(0, this.options.groupLimit));
    this.draining = null;
  }

  private async commitGroup(jobs: Job[]): Promise<void> {
    try {
      await runStatement(this.transaction, 'BEGIN IMMEDIATE');
      const settlements: Settlement[] = [];
      for (const run of splitIntoRuns(jobs)) settlements.push(...(await this.execute(run)));
      await runStatement(this.transaction, 'COMMIT');
      for (const { job, outcome, error } of settlements) {
        if (error === undefined) job.resolve(outcome);
        else job.reject(error);
      }
    } catch (error) {
      this.logger.error({ err: error }, 'A group of writes could not be committed');
      await runStatement(this.transaction, 'ROLLBACK').catch(() => undefined);
      for (const job of jobs) job.reject(new StoreUnavailableError(5));
    }
  }

  private async execute(run: Job[]): Promise<Settlement[]> {
    const [first] = run;
    if (first?.handler == null)
      return [await this.inSavepoint(first as Job, () => first!.work!(this.transaction))];
    const { handler } = first;
    const items = run.map((job) => job.item);
    const together = await this.inSavepoint(first, () => handler.write(this.transaction, items));
    if (together.error === undefined) {
      const outcomes = together.outcome as unknown[];
      return run.map((job, index) => ({ job, outcome: outcomes[index] }));
    }
    if (run.length === 1) return [together];
    // One of them is bad: each on its own, so that it fails alone.
    const settlements: Settlement[] = [];
    for (const job of run) {
      const alone = await this.inSavepoint(
        job,
        async () => (await handler.write(this.transaction, [job.item]))[0],
      );
      settlements.push(alone);
    }
    return settlements;
  }

  private async inSavepoint(job: Job, work: () => Promise<unknown>): Promise<Settlement> {
    await runStatement(this.transaction, 'SAVEPOINT job');
    try {
      const outcome = await work();
      await runStatement(this.transaction, 'RELEASE job');
      return { job, outcome };
    } catch (error) {
      // A full disk may have rolled the whole transaction back already: then this throws and all are refused.
      await runStatement(this.transaction, 'ROLLBACK TO job');
      await runStatement(this.transaction, 'RELEASE job');
      return { job, error: isStoreFailure(error) ? new StoreUnavailableError(5) : error };
    }
  }
}

/** Neighbours of the same handler form one run; a job of its own is a run of one. Order is kept. */
function splitIntoRuns(jobs: readonly Job[]): Job[][] {
  const runs: Job[][] = [];
  for (const job of jobs) {
    const last = runs.at(-1);
    if (job.handler !== null && last?.[0]?.handler === job.handler) last.push(job);
    else runs.push([job]);
  }
  return runs;
}

/** The store itself failed (full disk, I/O, lock), as opposed to what was asked of it. */
function isStoreFailure(error: unknown): boolean {
  const code =
    (error as { code?: string; parent?: { code?: string } } | null)?.parent?.code ??
    (error as { code?: string }).code;
  return code !== undefined && /^SQLITE_(FULL|IOERR|BUSY|LOCKED|READONLY|CANTOPEN|CORRUPT|NOMEM)/.test(code);
}
