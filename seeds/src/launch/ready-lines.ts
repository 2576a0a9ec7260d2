import type { Env } from '@ampkeep/ingest-api/dist/config/env.js';
import { demoAccounts } from '@ampkeep/ingest-api/dist/site/demo-accounts.js';

/** What a person needs to know once everything runs. */
export function readyLines(env: Env, postsPerMinute: number): string[] {
  const width = (column: (account: (typeof demoAccounts)[number]) => string) =>
    Math.max(...demoAccounts.map((account) => column(account).length));
  const emailWidth = width(({ email }) => email);
  const passwordWidth = width(({ password }) => password);
  return [
    '',
    `Ampkeep is ready: ${env.publicUrl}   (Ctrl-C stops it)`,
    '',
    'Demo accounts (address, password, role):',
    ...demoAccounts.map(
      ({ email, password, role }) =>
        `  ${email.padEnd(emailWidth)}  ${password.padEnd(passwordWidth)}  ${role}`,
    ),
    '',
    `Mails stay here: ${env.publicUrl}/mailbox`,
    postsPerMinute > 0
      ? `Six simulated stations post about ${postsPerMinute} results a minute.`
      : 'No simulated stations run.',
    `Data: ${env.dataDir}`,
    '',
  ];
}
