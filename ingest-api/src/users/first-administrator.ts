import { Inject, Injectable, Logger } from '@nestjs/common';
import { AuditService } from '../audit/audit.service.js';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { Writer } from '../database/writer.js';
import { canonicalEmail } from './email-address.js';
import { User } from './models/user.model.js';
import { passwordFault, PasswordsService } from './passwords.service.js';

/** Thrown at start; the message says which setting mends it. */
export class AccountsNotReadyError extends Error {
  override readonly name = 'AccountsNotReadyError';
}

/**
 * Real use never starts on a database with demo accounts: their passwords are public knowledge.
 * Disabled ones count too, since one click would enable them.
 * @throws AccountsNotReadyError
 */
export async function refuseDemoAccounts(env: Env): Promise<void> {
  if (env.mode === 'demo' || (await User.count({ where: { demo: true } })) === 0) return;
  throw new AccountsNotReadyError(
    `The database in ${env.dataDir} holds demo accounts, whose passwords anyone can read. ` +
      'Set AMPKEEP_DATA_DIR to a folder of its own for real use.',
  );
}

/** Lets the first person into an empty database. */
@Injectable()
export class FirstAdministrator {
  private readonly logger = new Logger(FirstAdministrator.name);

  constructor(
    private readonly writer: Writer,
    private readonly audit: AuditService,
    private readonly passwords: PasswordsService,
    @Inject(ENV) private readonly env: Env,
    @Inject(CLOCK) private readonly clock: Clock,
  ) {}

  /**
   * Creates the administrator named in the settings when there is no account at all; later starts, and
   * later changes of these settings, do nothing. Call it after the migrations.
   * @throws AccountsNotReadyError when real use would start with nobody able to sign in.
   */
  async createOnce(): Promise<void> {
    if ((await User.count()) > 0) return;
    const { adminEmail, adminPassword } = this.env;
    if (adminEmail === null || adminPassword === null) {
      if (this.env.mode === 'demo') return;
      throw new AccountsNotReadyError(
        'There is no account yet. Set AMPKEEP_ADMIN_EMAIL and AMPKEEP_ADMIN_PASSWORD for this first start.',
      );
    }
    const fault = passwordFault(adminPassword, '/AMPKEEP_ADMIN_PASSWORD');
    if (fault !== null) throw new AccountsNotReadyError(`AMPKEEP_ADMIN_PASSWORD: ${fault.detail}`);
    await this.create(canonicalEmail(adminEmail), await this.passwords.hash(adminPassword));
    this.logger.log('The first administrator was created; its settings may be removed now.');
  }

  private async create(email: string, passwordHash: string): Promise<void> {
    await this.writer.run(async (transaction) => {
      await User.create(
        {
          email,
          displayName: 'Administrator',
          role: 'administrator',
          passwordHash,
          active: true,
          demo: false,
          createdAt: this.clock(),
          lastSignInAt: null,
        },
        { transaction },
      );
      await this.audit.record(transaction, {
        actor: 'system',
        action: 'account.created',
        subject: email,
        detail: 'role administrator, from the settings of the first start',
      });
    });
  }
}
