import { Injectable, type OnModuleInit } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';

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

  note(stationId: number, productId: number, startedAt: number): void {
    const key = keyOf(stationId, productId);
    this.lastAt.set(key, Math.max(startedAt, this.lastAt.get(key) ?? 0));
  }
}

const keyOf = (stationId: number, productId: number): string => `${stationId} ${productId}`;
