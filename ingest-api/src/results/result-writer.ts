import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { BreachRecorder, type FailedResult, type RecordedBreach } from '../breaches/breach-recorder.js';
import { AmpkeepError, ConflictError } from '../common/errors.js';
import type { BatchHandler } from '../database/writer.js';
import { byAttemptOrder } from './attempts.js';
import type { PreparedResult } from './prepared-result.js';
import { buildAnswer } from './result-answer.js';
import {
  type CountedRow,
  type ExistingResult,
  findCounted,
  findExisting,
  findLots,
  insertResults,
  nextResultId,
  type PlacedResult,
  placeUnits,
  renumberAttempts,
  updateUnits,
} from './result-statements.js';
import type { ResultAnswer } from './result.types.js';

/** `replayed`: the id was stored before with the same content; the first answer stands. */
export type StoreOutcome =
  | { kind: 'stored' | 'replayed'; answer: ResultAnswer; breaches: RecordedBreach[] }
  | { kind: 'refused'; error: AmpkeepError };

/** Stores a group of results with a fixed number of statements. */
@Injectable()
export class ResultWriter implements BatchHandler<PreparedResult, StoreOutcome> {
  constructor(private readonly breaches: BreachRecorder) {}

  async write(transaction: Transaction, results: readonly PreparedResult[]): Promise<StoreOutcome[]> {
    const known = await findExisting(
      transaction,
      results.map((result) => result.resultUuid),
    );
    const existing = new Map(known.map((row) => [row.resultUuid, row]));
    const fresh = firstOfEachId(results.filter((result) => !existing.has(result.resultUuid)));
    const placed = fresh.length === 0 ? [] : await this.store(transaction, fresh);
    const breaches = await this.breaches.record(transaction, placed.filter(isBreaking).map(toFailedResult));
    const answers = new Map(placed.map((p) => [p.result, p.answer]));
    const byUuid = new Map(placed.map((p) => [p.result.resultUuid, p]));
    // Told once per group, by its first result.
    let untold = breaches;
    return results.map((result) => {
      const answer = answers.get(result);
      if (answer !== undefined) {
        const told = untold;
        untold = [];
        return { kind: 'stored', answer, breaches: told };
      }
      const twin = byUuid.get(result.resultUuid);
      return settleKnownId(result, twin === undefined ? existing.get(result.resultUuid)! : asExisting(twin));
    });
  }

  private async store(transaction: Transaction, fresh: readonly PreparedResult[]): Promise<PlacedResult[]> {
    const units = await placeUnits(transaction, fresh);
    const lots = await findLots(transaction, fresh);
    const unitIds = new Map(units.map((unit) => [`${unit.productId} ${unit.serialNumber}`, unit.unitId]));
    const lotsByName = new Map(lots.map((lot) => [`${lot.productId} ${lot.name}`, lot]));
    const counted = await findCounted(transaction, [...new Set(unitIds.values())]);
    let resultId = await nextResultId(transaction);
    const placed = fresh.map((result): PlacedResult => {
      const unitId = unitIds.get(`${result.productId} ${result.serialNumber}`)!;
      const lot = result.lot === null ? undefined : lotsByName.get(`${result.productId} ${result.lot}`);
      const attempts = addAttempt(counted, result, unitId);
      const answer = buildAnswer(result, {
        attempt: attempts.own,
        attempts: attempts.total,
        priorStagePassed:
          result.priorStageId === null ? null : latestPassed(counted, unitId, result.priorStageId),
        lotHeld: lot?.state === 'held',
      });
      return {
        result,
        resultId: resultId++,
        unitId,
        lotId: lot?.lotId ?? null,
        attempt: attempts.own,
        answer,
      };
    });
    await insertResults(transaction, placed);
    await renumberAttempts(transaction, changedNumbers(counted, placed));
    await updateUnits(transaction, [...new Set(placed.map((p) => p.unitId))]);
    return placed;
  }
}

function firstOfEachId(results: readonly PreparedResult[]): PreparedResult[] {
  const seen = new Map<string, PreparedResult>();
  for (const result of results) if (!seen.has(result.resultUuid)) seen.set(result.resultUuid, result);
  return [...seen.values()];
}

const asExisting = ({ result, answer }: PlacedResult): ExistingResult => ({
  resultUuid: result.resultUuid,
  stationId: result.stationId,
  canonicalSha256: result.canonicalSha256,
  answer: JSON.stringify(answer),
});

function settleKnownId(result: PreparedResult, existing: ExistingResult): StoreOutcome {
  if (existing.stationId === result.stationId && existing.canonicalSha256 === result.canonicalSha256) {
    return { kind: 'replayed', answer: JSON.parse(existing.answer) as ResultAnswer, breaches: [] };
  }
  const detail =
    existing.stationId === result.stationId
      ? 'This resultId is stored already with other content. Give a new measurement a new resultId.'
      : 'This resultId was used by another station. Make resultIds as random UUIDs.';
  return {
    kind: 'refused',
    error: new ConflictError('result_id_used', detail, [
      { pointer: '/resultId', code: 'resultIdUsed', detail },
    ]),
  };
}

/** Adds the result to the attempts of its unit and stage and gives its number and their count. */
function addAttempt(
  counted: CountedRow[],
  result: PreparedResult,
  unitId: number,
): { own: number | null; total: number } {
  const { stageId, resultUuid, startedAt, finishedAt, verdict } = result;
  if (result.counted)
    counted.push({ unitId, stageId, resultUuid, startedAt, finishedAt, verdict, attempt: null });
  const ordered = counted
    .filter((row) => row.unitId === unitId && row.stageId === stageId)
    .sort(byAttemptOrder);
  const index = ordered.findIndex((row) => row.resultUuid === resultUuid);
  return { own: index < 0 ? null : index + 1, total: ordered.length };
}

function latestPassed(counted: readonly CountedRow[], unitId: number, stageId: number): boolean {
  const latest = counted
    .filter((row) => row.unitId === unitId && row.stageId === stageId)
    .sort(byAttemptOrder)
    .at(-1);
  return latest?.verdict === 'pass';
}

/** Numbers that differ from what the rows hold, after all of the batch has its place. */
function changedNumbers(counted: readonly CountedRow[], placed: readonly PlacedResult[]): [string, number][] {
  const written = new Map(placed.map((p) => [p.result.resultUuid, p.attempt]));
  const groups = groupByUnitAndStage(counted);
  return [...groups.values()].flatMap((rows) =>
    rows
      .toSorted(byAttemptOrder)
      .map((row, index): [string, number, number | null] => [
        row.resultUuid,
        index + 1,
        written.get(row.resultUuid) ?? row.attempt,
      ])
      .filter(([, number, held]) => number !== held)
      .map(([uuid, number]): [string, number] => [uuid, number]),
  );
}

const isBreaking = ({ result }: PlacedResult): boolean =>
  result.runKind === 'production' && result.verdict === 'fail';

const toFailedResult = ({ result, resultId }: PlacedResult): FailedResult => ({
  resultId,
  resultUuid: result.resultUuid,
  stageId: result.stageId,
  partNumber: result.partNumber,
  stage: result.stage,
  serialNumber: result.serialNumber,
  startedAt: result.startedAt,
  receivedAt: result.receivedAt,
  seeded: result.seeded,
  judgement: result.judgement,
  failedMeasures: result.failedMeasures,
});

function groupByUnitAndStage(rows: readonly CountedRow[]): Map<string, CountedRow[]> {
  const groups = new Map<string, CountedRow[]>();
  for (const row of rows) {
    const key = `${row.unitId} ${row.stageId}`;
    groups.set(key, [...(groups.get(key) ?? []), row]);
  }
  return groups;
}
