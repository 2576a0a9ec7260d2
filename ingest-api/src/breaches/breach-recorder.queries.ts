import type { Transaction } from 'sequelize';
import { inList, recordTable, runStatement, selectRows } from '../database/sql.js';
import type { BreachMeasure, BreachState } from './models/breach.model.js';

export interface UnclosedBreach {
  causeKey: string;
  breachId: number;
  state: BreachState;
  mailedAt: number | null;
}

export interface NewBreach {
  causeKey: string;
  measure: BreachMeasure;
  stageId: number;
  openedAt: number;
}

export interface NewBreachEvent {
  breachId: number;
  resultId: number;
  at: number;
  text: string;
}

const RETURNED_COLUMNS = 'cause_key AS causeKey, breach_id AS breachId, state, mailed_at AS mailedAt';

const byCauseKey = (rows: readonly UnclosedBreach[]): Map<string, UnclosedBreach> =>
  new Map(rows.map((row) => [row.causeKey, row]));

export async function findUnclosed(
  transaction: Transaction,
  causeKeys: readonly string[],
): Promise<Map<string, UnclosedBreach>> {
  const sql = `SELECT ${RETURNED_COLUMNS} FROM breaches
    WHERE state <> 'closed' AND cause_key ${inList('?')}`;
  return byCauseKey(await selectRows<UnclosedBreach>(transaction, sql, JSON.stringify(causeKeys)));
}

export async function openBreaches(
  transaction: Transaction,
  breaches: readonly NewBreach[],
): Promise<Map<string, UnclosedBreach>> {
  if (breaches.length === 0) return new Map();
  const sql = `INSERT INTO breaches (cause_key, stage_id, measure, state, opened_at, last_event_at, event_count)
    SELECT causeKey, stageId, measure, 'open', openedAt, openedAt, 0
    FROM ${recordTable('?', ['causeKey', 'stageId', 'measure', 'openedAt'])} WHERE true
    RETURNING ${RETURNED_COLUMNS}`;
  return byCauseKey(await selectRows<UnclosedBreach>(transaction, sql, JSON.stringify(breaches)));
}

/** Adds the events and brings count, last event and latest result of their breaches up to date. */
export async function addEvents(transaction: Transaction, events: readonly NewBreachEvent[]): Promise<void> {
  const rows = JSON.stringify(events);
  await runStatement(
    transaction,
    `INSERT INTO breach_events (breach_id, result_id, at, text)
      SELECT breachId, resultId, at, text FROM ${recordTable('?', ['breachId', 'resultId', 'at', 'text'])}`,
    rows,
  );
  await runStatement(
    transaction,
    `UPDATE breaches SET
        event_count = event_count + added.events,
        last_event_at = max(last_event_at, added.last_at),
        latest_result_id = added.latest_result_id
      FROM (
        SELECT breachId AS breach_id, count(*) AS events, max(at) AS last_at, max(resultId) AS latest_result_id
        FROM ${recordTable('?', ['breachId', 'resultId', 'at'])} GROUP BY 1
      ) AS added
      WHERE breaches.breach_id = added.breach_id`,
    rows,
  );
}

export async function markMailed(
  transaction: Transaction,
  breachIds: ReadonlySet<number>,
  at: number,
): Promise<void> {
  if (breachIds.size === 0) return;
  await runStatement(
    transaction,
    `UPDATE breaches SET mailed_at = ? WHERE breach_id ${inList('?')}`,
    at,
    JSON.stringify([...breachIds]),
  );
}
