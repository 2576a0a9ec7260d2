import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import type { Verdict } from '../analysis/analysis.types.js';

export interface IntakeRow {
  /** 1 accepted, 0 refused. */
  accepted: number;
  rowId: number;
  receivedAt: number;
  lastReceivedAt: number;
  times: number;
  station: string;
  status: number;
  resultUuid: string | null;
  partNumber: string | null;
  serialNumber: string | null;
  verdict: Verdict | null;
  errors: string;
}

/** Place in the list: everything after (older than) this comes next. */
export interface IntakeCursor {
  lastReceivedAt: number;
  accepted: number;
  rowId: number;
}

const acceptedSql = `SELECT 1 AS accepted, r.result_id AS rowId, r.received_at AS receivedAt, r.received_at AS lastReceivedAt, 1 AS times,
    t.name AS station, 201 AS status, r.result_uuid AS resultUuid, p.part_number AS partNumber, u.serial_number AS serialNumber,
    r.verdict, '[]' AS errors
  FROM results r JOIN stations t USING (station_id) JOIN products p ON p.product_id = r.product_id JOIN units u ON u.unit_id = r.unit_id
  WHERE r.received_at <= $1 AND ($2 IS NULL OR t.name = $2) AND (r.received_at, 1, r.result_id) < ($1, $3, $4)
  ORDER BY r.received_at DESC, r.result_id DESC LIMIT $5`;

const refusedSql = `SELECT 0 AS accepted, f.refused_post_id AS rowId, f.first_received_at AS receivedAt, f.last_received_at AS lastReceivedAt, f.times,
    t.name AS station, f.status, f.result_uuid AS resultUuid, f.part_number AS partNumber, f.serial_number AS serialNumber,
    NULL AS verdict, f.errors
  FROM refused_posts f JOIN stations t USING (station_id)
  WHERE f.last_received_at <= $1 AND ($2 IS NULL OR t.name = $2) AND (f.last_received_at, 0, f.refused_post_id) < ($1, $3, $4)
  ORDER BY f.last_received_at DESC, f.refused_post_id DESC LIMIT $5`;

/** Accepted and refused posts in one list, newest first, by (time, kind, id). */
export function findIntake(
  sequelize: Sequelize,
  {
    kind,
    station,
    cursor,
  }: { kind: 'all' | 'accepted' | 'refused'; station: string | null; cursor: IntakeCursor | null },
  limit: number,
): Promise<IntakeRow[]> {
  const parts = [...(kind !== 'refused' ? [acceptedSql] : []), ...(kind !== 'accepted' ? [refusedSql] : [])];
  const { lastReceivedAt, accepted, rowId } = cursor ?? {
    lastReceivedAt: Number.MAX_SAFE_INTEGER,
    accepted: 2,
    rowId: 0,
  };
  return sequelize.query<IntakeRow>(
    `SELECT * FROM (${parts.map((part) => `SELECT * FROM (${part})`).join(' UNION ALL ')})
     ORDER BY lastReceivedAt DESC, accepted DESC, rowId DESC LIMIT $5`,
    { bind: [lastReceivedAt, station, accepted, rowId, limit], type: QueryTypes.SELECT },
  );
}
