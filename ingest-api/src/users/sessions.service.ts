import { randomBytes } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import { Op, QueryTypes, type Transaction } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import { InjectConnection } from '@nestjs/sequelize';
import type { Person } from '../auth/principals.js';
import { CLOCK, type Clock } from '../config/config.module.js';
import { Session } from './models/session.model.js';

const LIFETIME_MS = 12 * 3600 * 1000;

/** Another process on the same database (a command) may change accounts; its changes act within this time. */
const LONGEST_UNREAD_MS = 10_000;

const CACHE_LIMIT = 2000;

interface Remembered {
  person: Person;
  expiresAt: number;
  readAt: number;
}

const findOpenSession = `
  SELECT sessions.session_id AS sessionId, sessions.expires_at AS expiresAt, users.user_id AS userId,
         users.email, users.display_name AS displayName, users.role
  FROM sessions JOIN users USING (user_id)
  WHERE sessions.session_id = ? AND sessions.ended_at IS NULL AND sessions.expires_at > ? AND users.active = 1`;

/**
 * Sessions of signed-in people, kept on the server: ending one, disabling an account or changing a role
 * acts on the next request, whatever token a browser holds.
 */
@Injectable()
export class SessionsService {
  private readonly remembered = new Map<string, Remembered>();
  /** Counts forgettings: what was read from the database before one may be stale after it. */
  private generation = 0;

  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    @Inject(CLOCK) private readonly clock: Clock,
  ) {}

  /** Opens a session of 12 hours, inside the writer's transaction. */
  async open(transaction: Transaction, userId: number): Promise<Session> {
    const now = this.clock();
    await Session.destroy({ where: { expiresAt: { [Op.lte]: now } }, transaction });
    const sessionId = randomBytes(32).toString('base64url');
    return Session.create(
      { sessionId, userId, createdAt: now, expiresAt: now + LIFETIME_MS, endedAt: null },
      { transaction },
    );
  }

  /** Ends the sessions of an account, all or all but one. Call `forget` after the commit. */
  async endAll(transaction: Transaction, userId: number, exceptSessionId = ''): Promise<void> {
    await Session.update(
      { endedAt: this.clock() },
      { where: { userId, endedAt: null, sessionId: { [Op.ne]: exceptSessionId } }, transaction },
    );
  }

  /** Ends one session. Call `forget` after the commit. */
  async end(transaction: Transaction, sessionId: string): Promise<void> {
    await Session.update({ endedAt: this.clock() }, { where: { sessionId, endedAt: null }, transaction });
  }

  /** Drops what is remembered of an account, so that its next request reads the database. */
  forget(userId: number): void {
    this.generation += 1;
    for (const [sessionId, { person }] of this.remembered) {
      if (person.userId === userId) this.remembered.delete(sessionId);
    }
  }

  /** The person of an open session of an active account, else null. */
  async find(sessionId: string): Promise<Person | null> {
    const now = this.clock();
    const known = this.remembered.get(sessionId);
    if (known && known.expiresAt > now && now - known.readAt < LONGEST_UNREAD_MS) return known.person;
    const { generation } = this;
    const [row] = await this.sequelize.query<Person & { expiresAt: number }>(findOpenSession, {
      replacements: [sessionId, now],
      type: QueryTypes.SELECT,
    });
    this.remembered.delete(sessionId);
    if (!row) return null;
    const { expiresAt, ...person } = row;
    if (generation === this.generation) this.remember({ person, expiresAt, readAt: now });
    return person;
  }

  private remember(entry: Remembered): void {
    const oldest = this.remembered.keys().next();
    if (this.remembered.size >= CACHE_LIMIT && !oldest.done) this.remembered.delete(oldest.value);
    this.remembered.set(entry.person.sessionId, entry);
  }
}
