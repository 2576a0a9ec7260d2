import type { Transaction } from 'sequelize';
import { blobOfHex, inList, listTable, runStatement, selectRows } from '../database/sql.js';
import type { AttemptOrder } from './attempts.js';
import type { PreparedResult } from './prepared-result.js';
import type { ResultAnswer } from './result.types.js';

/*
 * The statements by which a batch of results is stored: each takes the whole batch as one JSON parameter,
 * so that their number doesn't grow with the batch.
 */

export interface ExistingResult {
  resultUuid: string;
  stationId: number;
  canonicalSha256: string;
  answer: string;
}

export function findExisting(transaction: Transaction, uuids: readonly string[]): Promise<ExistingResult[]> {
  return selectRows(
    transaction,
    `SELECT r.result_uuid AS resultUuid, r.station_id AS stationId, b.canonical_sha256 AS canonicalSha256, r.answer
     FROM results r JOIN result_bodies b USING (result_id)
     WHERE r.result_uuid ${inList('?')}`,
    JSON.stringify(uuids),
  );
}

export interface UnitPlace {
  productId: number;
  serialNumber: string;
  unitId: number;
  latestResultId: number | null;
}

const wantedTable = listTable('?', ['product_id', 'serial_number', 'lot']);

/** Adds lots and units not seen before and gives the units' ids. */
export async function placeUnits(
  transaction: Transaction,
  results: readonly PreparedResult[],
): Promise<UnitPlace[]> {
  const wanted = JSON.stringify(results.map((result) => [result.productId, result.serialNumber, result.lot]));
  await runStatement(
    transaction,
    `INSERT INTO lots (product_id, name)
     SELECT DISTINCT product_id, lot FROM ${wantedTable} WHERE lot IS NOT NULL
     ON CONFLICT DO NOTHING`,
    wanted,
  );
  await runStatement(
    transaction,
    `INSERT INTO units (product_id, serial_number)
     SELECT DISTINCT product_id, serial_number FROM ${wantedTable} WHERE true ON CONFLICT DO NOTHING`,
    wanted,
  );
  return selectRows(
    transaction,
    `SELECT u.product_id AS productId, u.serial_number AS serialNumber, u.unit_id AS unitId, u.latest_result_id AS latestResultId
     FROM (SELECT DISTINCT product_id, serial_number FROM ${wantedTable}) w
     JOIN units u USING (product_id, serial_number)`,
    wanted,
  );
}

export interface LotPlace {
  productId: number;
  name: string;
  lotId: number;
  state: string;
}

export function findLots(transaction: Transaction, results: readonly PreparedResult[]): Promise<LotPlace[]> {
  const wanted = results
    .filter((result) => result.lot !== null)
    .map((result) => [result.productId, result.lot]);
  return selectRows(
    transaction,
    `SELECT DISTINCT l.product_id AS productId, l.name, l.lot_id AS lotId, l.state
     FROM ${listTable('?', ['product_id', 'name'])} w JOIN lots l USING (product_id, name)`,
    JSON.stringify(wanted),
  );
}

export interface CountedRow extends AttemptOrder {
  unitId: number;
  stageId: number;
  verdict: string;
  attempt: number | null;
}

/** All counted results of these units, at every stage. */
export function findCounted(transaction: Transaction, unitIds: readonly number[]): Promise<CountedRow[]> {
  return selectRows(
    transaction,
    `SELECT unit_id AS unitId, stage_id AS stageId, result_uuid AS resultUuid, started_at AS startedAt,
            finished_at AS finishedAt, verdict, attempt
     FROM results WHERE counted = 1 AND unit_id ${inList('?')}`,
    JSON.stringify(unitIds),
  );
}

export async function nextResultId(transaction: Transaction): Promise<number> {
  const [row] = await selectRows<{ next: number }>(
    transaction,
    'SELECT coalesce(max(result_id), 0) + 1 AS next FROM results',
  );
  return row!.next;
}

export interface PlacedResult {
  result: PreparedResult;
  resultId: number;
  unitId: number;
  lotId: number | null;
  attempt: number | null;
  answer: ResultAnswer;
}

const resultColumns: readonly [column: string, value: (placed: PlacedResult) => unknown][] = [
  ['result_id', (p) => p.resultId],
  ['result_uuid', (p) => p.result.resultUuid],
  ['station_id', (p) => p.result.stationId],
  ['api_key_id', (p) => p.result.apiKeyId],
  ['product_id', (p) => p.result.productId],
  ['stage_id', (p) => p.result.stageId],
  ['unit_id', (p) => p.unitId],
  ['lot_id', (p) => p.lotId],
  ['run_kind', (p) => p.result.runKind],
  ['outcome', (p) => p.result.outcome],
  ['counted', (p) => (p.result.counted ? 1 : 0)],
  ['attempt', (p) => p.attempt],
  ['verdict', (p) => p.result.verdict],
  ['first_verdict', (p) => p.result.verdict],
  ['started_at', (p) => p.result.startedAt],
  ['finished_at', (p) => p.result.finishedAt],
  ['sent_at', (p) => p.result.sentAt],
  ['received_at', (p) => p.result.receivedAt],
  ['fixture', (p) => p.result.fixture],
  ['program_name', (p) => p.result.programName],
  ['program_version', (p) => p.result.programVersion],
  ['limit_set_version', (p) => p.result.limitSetVersion],
  ['test_plan_version', (p) => p.result.testPlanVersion],
  ['seeded', (p) => (p.result.seeded ? 1 : 0)],
  ['conductance_siemens', (p) => p.result.conductanceSiemens],
  ['conductance_uncertainty', (p) => p.result.conductanceUncertainty],
  ['limit_siemens', (p) => p.result.limitSiemens],
  ['impedance_ohms', (p) => p.result.impedanceOhms],
  ['impedance_bound', (p) => p.result.impedanceBound],
  ['reference_amps', (p) => p.result.referenceAmps],
  ['failed_measures', (p) => JSON.stringify(p.result.failedMeasures)],
  ['flags', (p) => JSON.stringify(p.result.flags)],
  ['judgement', (p) => JSON.stringify(p.result.judgement)],
  ['answer', (p) => JSON.stringify(p.answer)],
];

const insertResultsSql = `INSERT INTO results (${resultColumns.map(([column]) => column).join(', ')})
  SELECT * FROM ${listTable(
    '?',
    resultColumns.map(([column]) => column),
  )}`;

export async function insertResults(
  transaction: Transaction,
  placed: readonly PlacedResult[],
): Promise<void> {
  await runStatement(
    transaction,
    insertResultsSql,
    JSON.stringify(placed.map((p) => resultColumns.map(([, value]) => value(p)))),
  );
  await runStatement(
    transaction,
    `INSERT INTO result_bodies (result_id, canonical_sha256, body)
     SELECT result_id, canonical_sha256, ${blobOfHex('hex')} FROM ${listTable('?', ['result_id', 'canonical_sha256', 'hex'])}`,
    JSON.stringify(
      placed.map(({ resultId, result }) => [resultId, result.canonicalSha256, result.body.toString('hex')]),
    ),
  );
}

/** A late result moves the others' numbers. */
export async function renumberAttempts(
  transaction: Transaction,
  numbers: readonly [resultUuid: string, attempt: number][],
): Promise<void> {
  if (numbers.length === 0) return;
  await runStatement(
    transaction,
    `UPDATE results SET attempt = n.attempt
     FROM ${listTable('?', ['uuid', 'attempt'])} AS n WHERE result_uuid = n.uuid`,
    JSON.stringify(numbers),
  );
}

/**
 * The unit's newest result, and the lot of its newest result that names one: newest by the order of attempts,
 * not of arrival.
 */
export async function updateUnits(transaction: Transaction, unitIds: readonly number[]): Promise<void> {
  const newest = 'ORDER BY r.started_at DESC, r.finished_at DESC, r.result_uuid DESC LIMIT 1';
  await runStatement(
    transaction,
    `UPDATE units SET
       latest_result_id = (SELECT r.result_id FROM results r WHERE r.unit_id = units.unit_id ${newest}),
       lot_id = (SELECT r.lot_id FROM results r WHERE r.unit_id = units.unit_id AND r.lot_id IS NOT NULL ${newest})
     WHERE unit_id IN (SELECT value FROM json_each(?))`,
    JSON.stringify(unitIds),
  );
}
