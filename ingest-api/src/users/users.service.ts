import { Inject, Injectable } from '@nestjs/common';
import { type Transaction, UniqueConstraintError } from 'sequelize';
import { AuditService } from '../audit/audit.service.js';
import type { Person } from '../auth/principals.js';
import { ConflictError, InvalidError, NotFoundError } from '../common/errors.js';
import { CLOCK, type Clock } from '../config/config.module.js';
import { Writer } from '../database/writer.js';
import type { CreateUserDto } from './dto/create-user.dto.js';
import type { UpdateUserDto } from './dto/update-user.dto.js';
import { canonicalEmail } from './email-address.js';
import { User } from './models/user.model.js';
import { passwordFault, PasswordsService } from './passwords.service.js';
import { SessionsService } from './sessions.service.js';

/** Accounts of people. Nothing is ever removed: records name who did what. */
@Injectable()
export class UsersService {
  constructor(
    private readonly writer: Writer,
    private readonly audit: AuditService,
    private readonly passwords: PasswordsService,
    private readonly sessions: SessionsService,
    @Inject(CLOCK) private readonly clock: Clock,
  ) {}

  list(): Promise<User[]> {
    return User.findAll({ order: [['displayName', 'ASC']] });
  }

  /** @throws InvalidError for a poor password; ConflictError `email_taken`. */
  async create(wanted: CreateUserDto, actor: string): Promise<User> {
    const email = canonicalEmail(wanted.email);
    const passwordHash = await this.checkedHash(wanted.password);
    return this.writer.run(async (transaction) => {
      const user = await User.create(
        {
          email,
          displayName: wanted.displayName.trim(),
          role: wanted.role,
          passwordHash,
          active: true,
          demo: false,
          createdAt: this.clock(),
          lastSignInAt: null,
        },
        { transaction },
      ).catch(refuseTakenEmail);
      await this.audit.record(transaction, {
        actor,
        action: 'account.created',
        subject: email,
        detail: `role ${wanted.role}`,
      });
      return user;
    });
  }

  /**
   * Changes an account; a new role holds from its next request, disabling or a new password ends its
   * sessions (not the one the change is made from).
   * @throws ConflictError `last_administrator` when nobody could administer afterwards.
   */
  async update(userId: number, wanted: UpdateUserDto, by: Person): Promise<User> {
    const passwordHash = wanted.password === undefined ? null : await this.checkedHash(wanted.password);
    const updated = await this.writer.run(async (transaction) => {
      const user = await User.findByPk(userId, { transaction });
      if (user === null) throw new NotFoundError(`The account ${userId}`);
      const changed = this.apply(user, wanted, passwordHash);
      if (changed.length === 0) return user;
      await user.save({ transaction });
      if (!user.active || user.role !== 'administrator') await requireAnAdministrator(transaction);
      if (!user.active || passwordHash !== null) {
        await this.sessions.endAll(transaction, userId, by.sessionId);
      }
      await this.audit.record(transaction, {
        actor: by.email,
        action: 'account.changed',
        subject: user.email,
        detail: changed.join(', '),
      });
      return user;
    });
    this.sessions.forget(userId);
    return updated;
  }

  /** Sets the wanted values and says in words what became different. */
  private apply(user: User, wanted: UpdateUserDto, passwordHash: string | null): string[] {
    const changed: string[] = [];
    const displayName = wanted.displayName?.trim() ?? user.displayName;
    if (displayName !== user.displayName) changed.push(`name ${user.displayName} → ${displayName}`);
    const role = wanted.role ?? user.role;
    if (role !== user.role) changed.push(`role ${user.role} → ${role}`);
    const active = wanted.active ?? user.active;
    if (active !== user.active) changed.push(active ? 'enabled' : 'disabled');
    if (passwordHash !== null) changed.push('new password');
    user.set({ displayName, role, active, passwordHash: passwordHash ?? user.passwordHash });
    return changed;
  }

  private checkedHash(password: string): Promise<string> {
    const fault = passwordFault(password, '/password');
    if (fault !== null) throw new InvalidError([fault]);
    return this.passwords.hash(password);
  }
}

function refuseTakenEmail(error: unknown): never {
  if (!(error instanceof UniqueConstraintError)) throw error;
  const detail = 'There is an account with this address already. Enable or change that one.';
  throw new ConflictError('email_taken', detail, [{ pointer: '/email', code: 'email_taken', detail }]);
}

async function requireAnAdministrator(transaction: Transaction): Promise<void> {
  const left = await User.count({
    where: { role: 'administrator', active: true },
    transaction,
  });
  if (left > 0) return;
  throw new ConflictError(
    'last_administrator',
    'This is the last active administrator. Make another account administrator first.',
  );
}
