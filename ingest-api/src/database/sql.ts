import type { Transaction } from 'sequelize';
import type sqlite3 from 'sqlite3';

/**
 * Plain statements on the writer's own connection, past Sequelize's query builder: the hot path of
 * intake sends whole batches as one JSON parameter (`json_each(?)`), since a prepared run per row costs
 * a trip through the thread pool each.
 */
function connectionOf(transaction: Transaction): sqlite3.Database {
  return (transaction as Transaction & { connection: sqlite3.Database }).connection;
}

export function selectRows<Row>(transaction: Transaction, sql: string, ...values: unknown[]): Promise<Row[]> {
  return new Promise((resolve, reject) => {
    connectionOf(transaction).all<Row>(sql, values, (error, rows) => (error ? reject(error) : resolve(rows)));
  });
}

export function runStatement(
  transaction: Transaction,
  sql: string,
  ...values: unknown[]
): Promise<{ changes: number; lastId: number }> {
  return new Promise((resolve, reject) => {
    connectionOf(transaction).run(sql, values, function (this: sqlite3.RunResult, error: Error | null) {
      if (error) reject(error);
      else resolve({ changes: this.changes, lastId: this.lastID });
    });
  });
}

/*
 * What only SQLite knows, as fragments for the statements of `*.queries.ts` and `*-statements.ts`: a whole
 * list travels as one JSON parameter.
 */

/** `IN` over a JSON array: `WHERE unit_id ${inList('?')}`. */
export const inList = (parameter: string): string => `IN (SELECT value FROM json_each(${parameter}))`;

/** A JSON array of arrays as a table with these columns: `FROM ${listTable('?', ['id', 'at'])} AS u`. */
export const listTable = (parameter: string, columns: readonly string[]): string =>
  `(SELECT ${columns.map((column, index) => `value ->> ${index} AS ${column}`).join(', ')} FROM json_each(${parameter}))`;

/** A JSON array of objects as a table; each column takes the property of its name. */
export const recordTable = (parameter: string, columns: readonly string[]): string =>
  `(SELECT ${columns.map((column) => `value ->> '${column}' AS ${column}`).join(', ')} FROM json_each(${parameter}))`;

/** A BLOB from its hexadecimal text, since JSON carries no bytes. */
export const blobOfHex = (expression: string): string => `unhex(${expression})`;

/** Random hexadecimal text of `bytes` bytes. */
export const randomHex = (bytes: number): string => `lower(hex(randomblob(${bytes})))`;
