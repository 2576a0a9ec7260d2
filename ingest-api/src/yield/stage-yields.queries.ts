import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import type { YieldCounts } from '../analysis/yield/yield.types.js';

export interface StageYieldRow extends YieldCounts {
  stageId: number;
}

/**
 * Counts of each stage's cohort: units whose first counted attempt started in [from, to), epoch ms. The
 * latest attempt is the latest to date, whenever it was. Equals the pure recount `countYields`.
 */
export function findStageYields(sequelize: Sequelize, from: number, to: number): Promise<StageYieldRow[]> {
  return sequelize.query<StageYieldRow>(
    `SELECT f.stage_id AS stageId, count(*) AS total,
       sum(f.verdict = 'pass') AS firstPassed, sum(f.verdict = 'fail') AS firstFailed, sum(f.verdict = 'notProven') AS firstNotProven,
       sum(l.verdict = 'pass') AS latestPassed, sum(l.verdict = 'fail') AS latestFailed, sum(l.verdict = 'notProven') AS latestNotProven,
       sum(l.verdict <> 'pass' AND l.attempt < s.max_attempts) AS open
     FROM results f
       JOIN stages s ON s.stage_id = f.stage_id
       JOIN results l ON l.unit_id = f.unit_id AND l.stage_id = f.stage_id AND l.counted = 1
         AND l.attempt = (SELECT max(x.attempt) FROM results x WHERE x.unit_id = f.unit_id AND x.stage_id = f.stage_id AND x.counted = 1)
     WHERE f.counted = 1 AND f.attempt = 1 AND f.started_at >= $1 AND f.started_at < $2
     GROUP BY f.stage_id`,
    { bind: [from, to], type: QueryTypes.SELECT },
  );
}
