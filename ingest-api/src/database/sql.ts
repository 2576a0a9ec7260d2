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
