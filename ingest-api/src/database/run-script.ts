import type { QueryInterface } from 'sequelize';

/** Runs a migration's statements one after the other in one transaction: all or nothing. */
export async function runScript(context: QueryInterface, statements: readonly string[]): Promise<void> {
  await context.sequelize.transaction(async (transaction) => {
    for (const statement of statements) await context.sequelize.query(statement, { transaction });
  });
}
