import { Inject, Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { DateTime } from 'luxon';
import { Sequelize } from 'sequelize-typescript';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { findStationActivity } from './station-activity.queries.js';
import { StationRegister } from './station-register.service.js';

/** What a station did lately. */
export interface StationActivity {
  stationId: number;
  station: string;
  latestResultId: number | null;
  lastPostAt: number | null;
  /** Server minus station, of its newest post that said when it was sent. */
  clockSkewSeconds: number | null;
  postsToday: number;
  refusedToday: number;
}

@Injectable()
export class StationActivityService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly register: StationRegister,
    @Inject(ENV) private readonly env: Env,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  async all(): Promise<StationActivity[]> {
    const dayStart = DateTime.fromMillis(this.now(), { zone: this.env.timeZone }).startOf('day').toMillis();
    const rows = await findStationActivity(this.sequelize, dayStart);
    const byId = new Map(rows.map((row) => [row.stationId, row]));
    return this.register.all().map(({ stationId, name }) => {
      const row = byId.get(stationId);
      const skewMs = row?.lastPostAt == null || row.sentAt === null ? null : row.lastPostAt - row.sentAt;
      return {
        stationId,
        station: name,
        latestResultId: row?.latestResultId ?? null,
        lastPostAt: row?.lastPostAt ?? null,
        clockSkewSeconds: skewMs === null ? null : Math.round(skewMs / 1000),
        postsToday: row?.postsToday ?? 0,
        refusedToday: row?.refusedToday ?? 0,
      };
    });
  }
}
