import { Injectable, type OnModuleInit } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { CatalogueProduct } from '../products/catalogue.js';

const HOUR_MS = 3_600_000;

/** When each station last measured a golden unit of each product; asked for with every post. */
@Injectable()
export class GoldenChecksService implements OnModuleInit {
  private lastAt = new Map<string, number>();

  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async onModuleInit(): Promise<void> {
    const rows = await this.sequelize.query<{ stationId: number; productId: number; at: number }>(
      `SELECT station_id AS stationId, product_id AS productId, max(started_at) AS at
       FROM results WHERE run_kind = 'golden' GROUP BY station_id, product_id`,
      { type: QueryTypes.SELECT },
    );
    this.lastAt = new Map(rows.map((row) => [keyOf(row.stationId, row.productId), row.at]));
  }

  lastGoldenAt(stationId: number, productId: number): number | null {
    return this.lastAt.get(keyOf(stationId, productId)) ?? null;
  }

  /** When the station owes its next check, epoch ms; null when it never did one or the product has no golden unit. */
  dueAt(
    stationId: number,
    { productId, goldenCheckHours }: Pick<CatalogueProduct, 'productId' | 'goldenCheckHours'>,
  ): number | null {
    const lastAt = this.lastGoldenAt(stationId, productId);
    if (lastAt === null || goldenCheckHours.size === 0) return null;
    return lastAt + Math.min(...goldenCheckHours.values()) * HOUR_MS;
  }

  note(stationId: number, productId: number, startedAt: number): void {
    const key = keyOf(stationId, productId);
    this.lastAt.set(key, Math.max(startedAt, this.lastAt.get(key) ?? 0));
  }
}

const keyOf = (stationId: number, productId: number): string => `${stationId} ${productId}`;
