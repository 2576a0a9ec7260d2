import { Inject, Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { DateTime } from 'luxon';
import { Sequelize } from 'sequelize-typescript';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { HeartbeatsService, type LastHeartbeat } from './heartbeats.service.js';
import { findStationActivity, type StationActivityRow } from './station-activity.queries.js';
import { StationRegister } from './station-register.service.js';

/** What a station did lately. */
export interface StationActivity {
  stationId: number;
  station: string;
  latestResultId: number | null;
  lastPostAt: number | null;
  lastHeartbeatAt: number | null;
  /** Server minus station, of the newest post or heartbeat that said when it was sent. */
  clockSkewSeconds: number | null;
  postsToday: number;
  refusedToday: number;
}

@Injectable()
export class StationActivityService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly register: StationRegister,
    private readonly heartbeats: HeartbeatsService,
    @Inject(ENV) private readonly env: Env,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  async all(): Promise<StationActivity[]> {
    const dayStart = DateTime.fromMillis(this.now(), { zone: this.env.timeZone }).startOf('day').toMillis();
    const rows = await findStationActivity(this.sequelize, dayStart);
    const byId = new Map(rows.map((row) => [row.stationId, row]));
    return this.register.all().map(({ stationId, name }) => {
      const row = byId.get(stationId);
      const heartbeat = this.heartbeats.of(stationId);
      const skewMs = clockSkewMs(row, heartbeat);
      return {
        stationId,
        station: name,
        latestResultId: row?.latestResultId ?? null,
        lastPostAt: row?.lastPostAt ?? null,
        lastHeartbeatAt: heartbeat?.at ?? null,
        clockSkewSeconds: skewMs === null ? null : Math.round(skewMs / 1000),
        postsToday: row?.postsToday ?? 0,
        refusedToday: row?.refusedToday ?? 0,
      };
    });
  }
}

/** The newer of both tells; a heartbeat without the station's time tells nothing. */
function clockSkewMs(row: StationActivityRow | undefined, heartbeat: LastHeartbeat | null): number | null {
  const fromPost = row?.lastPostAt == null || row.sentAt === null ? null : row.lastPostAt - row.sentAt;
  const isNewer = heartbeat !== null && heartbeat.at >= (row?.lastPostAt ?? 0);
  return isNewer ? (heartbeat.clockSkewMs ?? fromPost) : fromPost;
}
