import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';

export interface StationActivityRow {
  stationId: number;
  latestResultId: number | null;
  lastPostAt: number | null;
  sentAt: number | null;
  postsToday: number;
  refusedToday: number;
}

/** What each station did: its newest post, and how many since `dayStart` (epoch ms). */
export function findStationActivity(sequelize: Sequelize, dayStart: number): Promise<StationActivityRow[]> {
  return sequelize.query<StationActivityRow>(
    `SELECT t.station_id AS stationId, r.result_id AS latestResultId, r.received_at AS lastPostAt, r.sent_at AS sentAt,
       (SELECT count(*) FROM results c WHERE c.station_id = t.station_id AND c.received_at >= $1
       ) AS postsToday,
       (SELECT coalesce(sum(times), 0) FROM refused_posts f WHERE f.station_id = t.station_id AND f.last_received_at >= $1) AS refusedToday
     FROM stations t LEFT JOIN results r ON r.result_id =
       (SELECT result_id FROM results WHERE station_id = t.station_id ORDER BY result_id DESC LIMIT 1)`,
    { bind: [dayStart], type: QueryTypes.SELECT },
  );
}
