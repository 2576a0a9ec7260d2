import { createHash } from 'node:crypto';
import { gzipSync } from 'node:zlib';
import { Inject, Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import type { StationPrincipal } from '../auth/principals.js';
import type { AmpkeepError } from '../common/errors.js';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { runStatement, selectRows } from '../database/sql.js';
import { Writer } from '../database/writer.js';
import { LiveService } from '../live/live.service.js';

/** A longer body is kept cut off: enough to see what is wrong, too little to fill the disk. */
const KEPT_BYTES = 256_000;
/** What a row takes besides its body and its reasons, roughly. */
const ROW_BYTES = 500;

interface KeptPost {
  bytes: Buffer;
  error: AmpkeepError;
  station: StationPrincipal;
  /** What could be read of it, however wrong the rest. */
  content: unknown;
}

/** Keeps what came with a valid key and was refused, so that a person can see why and mend it. */
@Injectable()
export class RefusedPostsService {
  /** What all kept posts take; null until it was asked for. A guess that is set right whenever it says "full". */
  private storedBytes: number | null = null;

  constructor(
    private readonly writer: Writer,
    private readonly live: LiveService,
    @Inject(ENV) private readonly env: Env,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  /** The same body refused again only counts up. The oldest make room when the quota is full. */
  async keep(post: KeptPost): Promise<void> {
    const body = gzipSync(post.bytes.subarray(0, KEPT_BYTES));
    const errors = JSON.stringify(post.error.errors);
    const storedBytes = ROW_BYTES + body.length + Buffer.byteLength(errors);
    await this.writer.run(async (transaction) => {
      await this.insert(transaction, post, { body, errors, storedBytes });
      this.storedBytes = (this.storedBytes ?? (await totalBytes(transaction))) + storedBytes;
      if (this.storedBytes > this.quota) this.storedBytes = await this.makeRoom(transaction);
    });
    this.live.publish({ topic: 'intake', id: null });
  }

  private get quota(): number {
    return this.env.refusedQuotaMegabytes * 1_000_000;
  }

  private async insert(
    transaction: Transaction,
    { bytes, error, station, content }: KeptPost,
    { body, errors, storedBytes }: { body: Buffer; errors: string; storedBytes: number },
  ): Promise<void> {
    const now = this.now();
    await runStatement(
      transaction,
      `INSERT INTO refused_posts (station_id, api_key_id, status, title, detail, errors, result_uuid, part_number, serial_number,
         body_sha256, body, body_bytes, stored_bytes, truncated, first_received_at, last_received_at)
       VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)
       ON CONFLICT (station_id, status, body_sha256) DO UPDATE SET
         times = times + 1, last_received_at = excluded.last_received_at, api_key_id = excluded.api_key_id,
         detail = excluded.detail, errors = excluded.errors`,
      station.stationId,
      station.apiKeyId,
      error.status,
      error.title,
      error.message,
      errors,
      textOf(content, 'resultId'),
      textOf(content, 'partNumber'),
      textOf(content, 'serialNumber'),
      createHash('sha256').update(bytes).digest('hex'),
      body,
      bytes.length,
      storedBytes,
      bytes.length > KEPT_BYTES ? 1 : 0,
      now,
      now,
    );
  }

  /** Gives what is left. */
  private async makeRoom(transaction: Transaction): Promise<number> {
    if ((await totalBytes(transaction)) > this.quota) {
      // Down to nine tenths, so that a full house isn't swept with every post.
      await runStatement(
        transaction,
        `DELETE FROM refused_posts WHERE refused_post_id IN (
           SELECT refused_post_id FROM (
             SELECT refused_post_id, sum(stored_bytes) OVER (ORDER BY last_received_at DESC, refused_post_id DESC) AS newer_bytes
             FROM refused_posts) WHERE newer_bytes > ?)`,
        this.quota * 0.9,
      );
    }
    return totalBytes(transaction);
  }
}

async function totalBytes(transaction: Transaction): Promise<number> {
  const [row] = await selectRows<{ bytes: number }>(
    transaction,
    'SELECT total(stored_bytes) AS bytes FROM refused_posts',
  );
  return row!.bytes;
}

function textOf(content: unknown, name: string): string | null {
  const value =
    content !== null && typeof content === 'object' ? (content as Record<string, unknown>)[name] : undefined;
  return typeof value === 'string' ? value.slice(0, 64) : null;
}
