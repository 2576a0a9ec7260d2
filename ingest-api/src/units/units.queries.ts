import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import { inList } from '../database/sql.js';
import type { Verdict } from '../analysis/analysis.types.js';
import type { AskedResult } from './dto/unit-query.dto.js';

export interface UnitFilter {
  search?: string;
  partNumber?: string;
  lot?: string;
  /** The result that everything below is about. */
  of?: AskedResult;
  /** Epoch ms, [startedFrom, startedBefore). */
  startedFrom?: number;
  startedBefore?: number;
  stage?: string;
  station?: string;
  fixture?: string;
  programVersion?: string;
  verdict?: string;
  failedMeasure?: string;
  /** Only units whose latest result is older than this row id. */
  before?: number | null;
}

export interface UnitRow {
  unitId: number;
  serialNumber: string;
  partNumber: string;
  productId: number;
  lot: string | null;
  latestResultId: number;
  /** The result that the filter is about. */
  askedResultId: number;
}

/** LIKE pattern for "begins with", its own wildcards taken literally. */
const prefixPattern = (text: string): string => `${text.replace(/[\\%_]/g, '\\$&')}%`;

/** Which results `r` of a unit `u` are looked at; a unit has a first attempt at each stage, but is listed once. */
const LATEST = 'r.result_id = u.latest_result_id';
const FIRST_ATTEMPT = 'r.unit_id = u.unit_id AND r.counted = 1 AND r.attempt = 1';

/** Units by their latest result, the newest first. */
export function findUnits(sequelize: Sequelize, filter: UnitFilter, limit: number): Promise<UnitRow[]> {
  const all: [string, unknown][] = [
    [`u.serial_number LIKE $v ESCAPE '\\'`, filter.search ? prefixPattern(filter.search) : undefined],
    ['p.part_number = $v', filter.partNumber],
    ['l.name = $v', filter.lot],
    ['r.started_at >= $v', filter.startedFrom],
    ['r.started_at < $v', filter.startedBefore],
    ['s.name = $v', filter.stage],
    ['t.name = $v', filter.station],
    ['r.fixture = $v', filter.fixture],
    ['r.program_version = $v', filter.programVersion],
    ['r.verdict = $v', filter.verdict],
    ['EXISTS (SELECT 1 FROM json_each(r.failed_measures) AS m WHERE m.value = $v)', filter.failedMeasure],
    ['u.latest_result_id < $v', filter.before ?? undefined],
  ];
  const conditions = all.filter(([, value]) => value !== undefined);
  const where = conditions.map(([sql], index) => sql.replace('$v', `$${index + 1}`));
  const isLatest = (filter.of ?? 'latest') === 'latest';
  return sequelize.query<UnitRow>(
    `SELECT u.unit_id AS unitId, u.serial_number AS serialNumber, p.part_number AS partNumber, p.product_id AS productId,
       l.name AS lot, u.latest_result_id AS latestResultId, ${isLatest ? 'r.result_id' : 'max(r.result_id)'} AS askedResultId
     FROM units u JOIN products p USING (product_id)
       JOIN results r ON ${isLatest ? LATEST : FIRST_ATTEMPT}
       JOIN stages s ON s.stage_id = r.stage_id JOIN stations t ON t.station_id = r.station_id
       LEFT JOIN lots l ON l.lot_id = u.lot_id
     ${where.length > 0 ? `WHERE ${where.join(' AND ')}` : ''}
     ${isLatest ? '' : 'GROUP BY u.unit_id'}
     ORDER BY u.latest_result_id DESC LIMIT $${conditions.length + 1}`,
    { bind: [...conditions.map(([, value]) => value), limit], type: QueryTypes.SELECT },
  );
}

export interface UnitStageRow {
  unitId: number;
  stageId: number;
  attempts: number;
  verdict: Verdict;
}

/** Attempts and latest verdict of each unit at each stage, counted results only. */
export function findUnitStages(sequelize: Sequelize, unitIds: readonly number[]): Promise<UnitStageRow[]> {
  return sequelize.query<UnitStageRow>(
    `SELECT unit_id AS unitId, stage_id AS stageId, attempt AS attempts, verdict
     FROM results r WHERE counted = 1 AND unit_id ${inList('$1')} AND attempt =
       (SELECT max(l.attempt) FROM results l WHERE l.unit_id = r.unit_id AND l.stage_id = r.stage_id AND l.counted = 1)`,
    { bind: [JSON.stringify(unitIds)], type: QueryTypes.SELECT },
  );
}
