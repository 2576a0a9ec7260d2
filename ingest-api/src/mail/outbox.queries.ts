import { Op, type Transaction } from 'sequelize';
import { randomHex, recordTable, runStatement, selectRows } from '../database/sql.js';
import { OutboxMail } from './models/outbox-mail.model.js';

/** Asks for one mail per active quality lead. */
export interface BreachMailOrder {
  breachId: number;
  subject: string;
  createdAt: number;
}

/** A mail that this process is about to send. */
export type ClaimedMail = Pick<
  OutboxMail,
  'mailId' | 'messageId' | 'breachId' | 'recipient' | 'subject' | 'attempts' | 'createdAt'
>;

/**
 * Writes the mails, each with the Message-ID that it keeps on every retry.
 * @returns the breaches that somebody is told of: none while there is no active quality lead.
 */
export async function enqueueBreachMails(
  transaction: Transaction,
  orders: readonly BreachMailOrder[],
  host: string,
): Promise<Set<number>> {
  const sql = `INSERT INTO outbox (message_id, breach_id, recipient, subject, state, created_at, next_try_at)
    SELECT '<breach-' || wanted.breachId || '-' || ${randomHex(12)} || '@' || ? || '>',
      wanted.breachId, users.email, wanted.subject, 'waiting', wanted.createdAt, wanted.createdAt
    FROM ${recordTable('?', ['breachId', 'subject', 'createdAt'])} AS wanted CROSS JOIN users
    WHERE users.role = 'qualityLead' AND users.active = 1
    RETURNING breach_id AS breachId`;
  const rows = await selectRows<{ breachId: number }>(transaction, sql, host, JSON.stringify(orders));
  return new Set(rows.map(({ breachId }) => breachId));
}

/** Asked before claiming, since most of the time there is nothing to write. */
export const hasDueMail = async (now: number): Promise<boolean> =>
  (await OutboxMail.findOne({
    where: { state: 'waiting', nextTryAt: { [Op.lte]: now } },
    attributes: ['mailId'],
    raw: true,
  })) !== null;

/**
 * Takes mails that are due. Until `claimedUntil` nobody takes them again; should this process die before
 * it says how sending went, they are due then.
 */
export function claimDueMails(
  transaction: Transaction,
  now: number,
  claimedUntil: number,
  limit: number,
): Promise<ClaimedMail[]> {
  const sql = `UPDATE outbox SET attempts = attempts + 1, next_try_at = ?
    WHERE mail_id IN (
      SELECT mail_id FROM outbox WHERE state = 'waiting' AND next_try_at <= ? ORDER BY next_try_at LIMIT ?
    )
    RETURNING mail_id AS mailId, message_id AS messageId, breach_id AS breachId, recipient, subject, attempts,
      created_at AS createdAt`;
  return selectRows<ClaimedMail>(transaction, sql, claimedUntil, now, limit);
}

export async function markSent(transaction: Transaction, mailId: number, at: number): Promise<void> {
  const sql = `UPDATE outbox SET state = 'sent', sent_at = ?, last_error = NULL WHERE mail_id = ?`;
  await runStatement(transaction, sql, at, mailId);
}

export async function markForRetry(
  transaction: Transaction,
  mailId: number,
  nextTryAt: number,
  error: string,
): Promise<void> {
  const sql = 'UPDATE outbox SET next_try_at = ?, last_error = ? WHERE mail_id = ?';
  await runStatement(transaction, sql, nextTryAt, error, mailId);
}

export async function markFailed(transaction: Transaction, mailId: number, error: string): Promise<void> {
  const sql = `UPDATE outbox SET state = 'failed', last_error = ? WHERE mail_id = ?`;
  await runStatement(transaction, sql, error, mailId);
}
