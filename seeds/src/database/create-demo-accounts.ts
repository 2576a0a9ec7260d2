import { AuditService } from '@ampkeep/ingest-api/dist/audit/audit.service.js';
import { Writer } from '@ampkeep/ingest-api/dist/database/writer.js';
import { demoAccounts } from '@ampkeep/ingest-api/dist/site/demo-accounts.js';
import { User } from '@ampkeep/ingest-api/dist/users/models/user.model.js';
import { PasswordsService } from '@ampkeep/ingest-api/dist/users/passwords.service.js';
import type { INestApplicationContext } from '@nestjs/common';

/** One account for each role, marked as the demo's so that real use refuses a database that holds them. */
export async function createDemoAccounts(app: INestApplicationContext, createdAt: Date): Promise<void> {
  const passwords = app.get(PasswordsService, { strict: false });
  const audit = app.get(AuditService, { strict: false });
  const rows = await Promise.all(
    demoAccounts.map(async ({ email, displayName, role, password }) => ({
      email,
      displayName,
      role,
      passwordHash: await passwords.hash(password),
      active: true,
      demo: true,
      createdAt: createdAt.getTime(),
      lastSignInAt: null,
    })),
  );
  await app.get(Writer, { strict: false }).run(async (transaction) => {
    await User.bulkCreate(rows, { transaction });
    for (const { email, role } of rows) {
      await audit.record(transaction, {
        actor: 'system',
        action: 'account.created',
        subject: email,
        detail: `role ${role}, demo account`,
      });
    }
  });
}
