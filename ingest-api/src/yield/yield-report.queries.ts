import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import type { YieldCounts } from '../analysis/yield/yield.types.js';
import { listTable } from '../database/sql.js';
import type { SplitKind } from './dto/yield-query.dto.js';
import type { TimeBucket } from './time-buckets.js';

export interface CohortFilter {
  partNumber?: string;
  stage?: string;
  station?: string;
  fixture?: string;
  lot?: string;
  programVersion?: string;
}

/** Where each attribute of a first attempt `f` stands; names come from this list only. */
const attributeSql: Record<keyof CohortFilter, string> = {
  partNumber: 'p.part_number',
  stage: 's.name',
  station: 't.name',
  fixture: 'f.fixture',
  lot: 'o.name',
  programVersion: 'f.program_version',
};

const splitSql: Record<SplitKind, string> = {
  product: attributeSql.partNumber,
  stage: attributeSql.stage,
  station: attributeSql.station,
  fixture: attributeSql.fixture,
  lot: attributeSql.lot,
  programVersion: attributeSql.programVersion,
};

export interface CohortRow extends YieldCounts {
  /** Place in the list of buckets. */
  bucket: number;
  stageId: number;
  /** Of the split; null without one, or where the attribute is missing. */
  groupName: string | null;
  /** Units tested more than once. */
  retested: number;
  /** Of these, those whose second attempt passed. */
  passedOnSecond: number;
}

interface Bound {
  sql: string;
  values: unknown[];
}

/** Joins and conditions of the cohort: first counted attempts `f` within the buckets, by the filter. */
function cohort(buckets: readonly TimeBucket[], filter: CohortFilter): Bound {
  const wanted = (Object.entries(filter) as [keyof CohortFilter, string | undefined][]).filter(
    ([, value]) => value !== undefined,
  );
  const conditions = wanted.map(([name], index) => ` AND ${attributeSql[name]} = $${index + 2}`);
  return {
    sql: `FROM ${listTable('$1', ['bucket', 'start_at', 'end_at'])} AS b
       JOIN results f ON f.counted = 1 AND f.attempt = 1 AND f.started_at >= b.start_at AND f.started_at < b.end_at
       JOIN products p ON p.product_id = f.product_id JOIN stages s ON s.stage_id = f.stage_id
       JOIN stations t ON t.station_id = f.station_id LEFT JOIN lots o ON o.lot_id = f.lot_id
       JOIN results l ON l.unit_id = f.unit_id AND l.stage_id = f.stage_id AND l.counted = 1 AND l.attempt =
         (SELECT max(x.attempt) FROM results x WHERE x.unit_id = f.unit_id AND x.stage_id = f.stage_id AND x.counted = 1)
       LEFT JOIN results d ON d.unit_id = f.unit_id AND d.stage_id = f.stage_id AND d.counted = 1 AND d.attempt = 2
     WHERE true${conditions.join('')}`,
    values: [
      JSON.stringify(buckets.map(({ startAt, endAt }, index) => [index, startAt, endAt])),
      ...wanted.map(([, value]) => value),
    ],
  };
}

/** Counts of each bucket, stage and group. The database counts; nothing is added up here. */
export function findCohortCounts(
  sequelize: Sequelize,
  buckets: readonly TimeBucket[],
  filter: CohortFilter,
  split: SplitKind | undefined,
): Promise<CohortRow[]> {
  const { sql, values } = cohort(buckets, filter);
  const group = split === undefined ? 'NULL' : splitSql[split];
  return sequelize.query<CohortRow>(
    `SELECT b.bucket, f.stage_id AS stageId, ${group} AS groupName, count(*) AS total,
       sum(f.verdict = 'pass') AS firstPassed, sum(f.verdict = 'fail') AS firstFailed, sum(f.verdict = 'notProven') AS firstNotProven,
       sum(l.verdict = 'pass') AS latestPassed, sum(l.verdict = 'fail') AS latestFailed, sum(l.verdict = 'notProven') AS latestNotProven,
       sum(l.verdict <> 'pass' AND l.attempt < s.max_attempts) AS open,
       sum(d.result_id IS NOT NULL) AS retested, sum(coalesce(d.verdict, '') = 'pass') AS passedOnSecond
     ${sql} GROUP BY b.bucket, f.stage_id, groupName ORDER BY b.bucket`,
    { bind: values, type: QueryTypes.SELECT },
  );
}

export interface FailingMeasureRow {
  measure: string;
  units: number;
}

/** How many first attempts failed each measure, the most frequent first. */
export function findFailingMeasures(
  sequelize: Sequelize,
  buckets: readonly TimeBucket[],
  filter: CohortFilter,
): Promise<FailingMeasureRow[]> {
  const whole = [{ startAt: buckets[0]!.startAt, endAt: buckets.at(-1)!.endAt }];
  const { sql, values } = cohort(whole, filter);
  return sequelize.query<FailingMeasureRow>(
    `SELECT m.value AS measure, count(*) AS units ${sql.replace('WHERE true', `JOIN json_each(f.failed_measures) AS m WHERE f.verdict = 'fail'`)}
     GROUP BY m.value ORDER BY units DESC, measure`,
    { bind: values, type: QueryTypes.SELECT },
  );
}

/** Aborted and all production runs that started in [from, to), by the filter. */
export async function countAborts(
  sequelize: Sequelize,
  from: number,
  to: number,
  filter: CohortFilter,
): Promise<{ aborted: number; total: number }> {
  const wanted = (Object.entries(filter) as [keyof CohortFilter, string | undefined][]).filter(
    ([, value]) => value !== undefined,
  );
  const conditions = wanted.map(([name], index) => ` AND ${attributeSql[name]} = $${index + 3}`);
  const [row] = await sequelize.query<{ aborted: number | null; total: number }>(
    `SELECT sum(f.verdict = 'aborted') AS aborted, count(*) AS total
     FROM results f JOIN products p ON p.product_id = f.product_id JOIN stages s ON s.stage_id = f.stage_id
       JOIN stations t ON t.station_id = f.station_id LEFT JOIN lots o ON o.lot_id = f.lot_id
     WHERE f.run_kind = 'production' AND f.voided_at IS NULL AND f.started_at >= $1 AND f.started_at < $2${conditions.join('')}`,
    { bind: [from, to, ...wanted.map(([, value]) => value)], type: QueryTypes.SELECT },
  );
  return { aborted: row?.aborted ?? 0, total: row?.total ?? 0 };
}

export interface ProgramRow {
  partNumber: string;
  stage: string;
  programName: string;
  programVersion: string;
  firstAt: number;
}

/** When each program version first ran at each stage, if that was in [from, to). */
export function findNewPrograms(sequelize: Sequelize, from: number, to: number): Promise<ProgramRow[]> {
  return sequelize.query<ProgramRow>(
    `SELECT p.part_number AS partNumber, s.name AS stage, f.program_name AS programName, f.program_version AS programVersion,
       min(f.started_at) AS firstAt
     FROM results f JOIN products p USING (product_id) JOIN stages s ON s.stage_id = f.stage_id
     WHERE f.program_version IS NOT NULL GROUP BY f.stage_id, f.program_name, f.program_version
     HAVING firstAt >= $1 AND firstAt < $2
       AND firstAt > (SELECT min(e.started_at) FROM results e WHERE e.stage_id = f.stage_id)`,
    { bind: [from, to], type: QueryTypes.SELECT },
  );
}
