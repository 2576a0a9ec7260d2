import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import type { Bound, Outcome, Verdict } from '../analysis/analysis.types.js';
import { inList } from '../database/sql.js';
import type { RunKind } from './result.types.js';

export interface RunItemRow {
  /** Row id. */
  resultId: number;
  resultUuid: string;
  receivedAt: number;
  startedAt: number;
  unitId: number;
  stageId: number;
  partNumber: string;
  serialNumber: string;
  lot: string | null;
  stage: string;
  station: string;
  attempt: number | null;
  verdict: Verdict;
  runKind: RunKind;
  outcome: Outcome;
  conductanceSiemens: number | null;
  conductanceUncertainty: number | null;
  limitSiemens: number | null;
  impedanceOhms: number | null;
  impedanceBound: Bound;
  referenceAmps: number | null;
  failedMeasures: string;
  flags: string;
}

/** Every filter is optional; each has an index to lean on. */
export interface RunItemFilter {
  resultIds?: readonly number[];
  resultUuid?: string;
  unitId?: number;
  partNumber?: string;
  serialNumber?: string;
  stage?: string;
  station?: string;
  lot?: string;
  verdict?: string;
  runKind?: string;
  /** Only rows older than this row id. */
  before?: number | null;
}

type Condition = [sql: string, value: unknown];

function conditionsOf(filter: RunItemFilter): Condition[] {
  const all: Condition[] = [
    [`r.result_id ${inList('$v')}`, filter.resultIds && JSON.stringify(filter.resultIds)],
    ['r.result_uuid = $v', filter.resultUuid?.toLowerCase()],
    ['r.unit_id = $v', filter.unitId],
    ['p.part_number = $v', filter.partNumber],
    ['u.serial_number = $v', filter.serialNumber],
    ['s.name = $v', filter.stage],
    ['t.name = $v', filter.station],
    ['l.name = $v', filter.lot],
    ['r.verdict = $v', filter.verdict],
    ['r.run_kind = $v', filter.runKind],
    ['r.result_id < $v', filter.before ?? undefined],
  ];
  return all.filter(([, value]) => value !== undefined);
}

/** Results as lists show them, newest arrival first. */
export function findRunItems(
  sequelize: Sequelize,
  filter: RunItemFilter,
  limit: number,
): Promise<RunItemRow[]> {
  const conditions = conditionsOf(filter);
  const where = conditions.map(([sql], index) => sql.replace('$v', `$${index + 1}`));
  return sequelize.query<RunItemRow>(
    `SELECT r.result_id AS resultId, r.result_uuid AS resultUuid, r.received_at AS receivedAt, r.started_at AS startedAt,
       r.unit_id AS unitId, r.stage_id AS stageId, p.part_number AS partNumber, u.serial_number AS serialNumber,
       l.name AS lot, s.name AS stage, t.name AS station, r.attempt, r.verdict, r.run_kind AS runKind, r.outcome,
       r.conductance_siemens AS conductanceSiemens, r.conductance_uncertainty AS conductanceUncertainty,
       r.limit_siemens AS limitSiemens, r.impedance_ohms AS impedanceOhms, r.impedance_bound AS impedanceBound,
       r.reference_amps AS referenceAmps, r.failed_measures AS failedMeasures, r.flags
     FROM results r JOIN products p USING (product_id) JOIN units u ON u.unit_id = r.unit_id
       JOIN stages s ON s.stage_id = r.stage_id JOIN stations t ON t.station_id = r.station_id
       LEFT JOIN lots l ON l.lot_id = r.lot_id
     ${where.length > 0 ? `WHERE ${where.join(' AND ')}` : ''}
     ORDER BY r.result_id DESC LIMIT $${conditions.length + 1}`,
    { bind: [...conditions.map(([, value]) => value), limit], type: QueryTypes.SELECT },
  );
}
