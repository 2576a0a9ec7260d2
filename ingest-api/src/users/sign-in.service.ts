import { Inject, Injectable, Logger } from '@nestjs/common';
import { AuditService } from '../audit/audit.service.js';
import type { Person } from '../auth/principals.js';
import { InvalidError, NotSignedInError } from '../common/errors.js';
import { CLOCK, type Clock } from '../config/config.module.js';
import { Writer } from '../database/writer.js';
import type { ChangePasswordDto } from './dto/change-password.dto.js';
import type { SignInDto } from './dto/sign-in.dto.js';
import { canonicalEmail } from './email-address.js';
import type { Session } from './models/session.model.js';
import { User } from './models/user.model.js';
import { passwordFault, PasswordsService } from './passwords.service.js';
import { SessionsService } from './sessions.service.js';
import { SignInThrottle } from './sign-in-throttle.js';

/** Signing in and out, and what a person does with the own password. */
@Injectable()
export class SignInService {
  private readonly logger = new Logger(SignInService.name);

  constructor(
    private readonly writer: Writer,
    private readonly audit: AuditService,
    private readonly passwords: PasswordsService,
    private readonly sessions: SessionsService,
    private readonly throttle: SignInThrottle,
    @Inject(CLOCK) private readonly clock: Clock,
  ) {}

  /**
   * Opens a session. Unknown address, disabled account and wrong password get one answer in one time.
   * @throws NotSignedInError; TooManyRequestsError after too many failures.
   */
  async signIn({ email, password }: SignInDto, address: string): Promise<{ user: User; session: Session }> {
    const account = canonicalEmail(email);
    const attempt = this.throttle.begin(account, address);
    const user = await User.findOne({ where: { email: account, active: true } });
    if (!(await this.passwords.matches(password, user?.passwordHash ?? null)) || user === null) {
      this.logger.warn({ address }, 'Failed sign-in');
      throw new NotSignedInError('Address or password is wrong, or the account is disabled.');
    }
    attempt.succeeded();
    const checkedHash = user.passwordHash;
    return this.writer.run(async (transaction) => {
      // Read again: it may have been disabled, or got another password, while the check ran.
      await user.reload({ transaction });
      if (!user.active || user.passwordHash !== checkedHash) throw new NotSignedInError();
      await user.update({ lastSignInAt: this.clock() }, { transaction });
      const session = await this.sessions.open(transaction, user.userId);
      await this.audit.record(transaction, {
        actor: user.email,
        action: 'session.started',
        subject: user.email,
        detail: null,
      });
      return { user, session };
    });
  }

  /** The account of someone who is signed in. */
  async account(person: Person): Promise<User> {
    const user = await User.findByPk(person.userId);
    if (user === null) throw new NotSignedInError();
    return user;
  }

  async signOut(person: Person): Promise<void> {
    await this.writer.run(async (transaction) => {
      await this.sessions.end(transaction, person.sessionId);
      await this.audit.record(transaction, {
        actor: person.email,
        action: 'session.ended',
        subject: person.email,
        detail: null,
      });
    });
    this.sessions.forget(person.userId);
  }

  /**
   * Changes the own password and ends the person's other sessions.
   * @throws InvalidError when the current one is wrong or the new one is poor.
   */
  async changePassword(
    person: Person,
    { currentPassword, newPassword }: ChangePasswordDto,
    address: string,
  ): Promise<void> {
    const fault = passwordFault(newPassword, '/newPassword');
    if (fault !== null) throw new InvalidError([fault]);
    const attempt = this.throttle.begin(person.email, address);
    const { passwordHash } = await this.account(person);
    if (!(await this.passwords.matches(currentPassword, passwordHash))) {
      const detail = 'This is not your current password.';
      throw new InvalidError([{ pointer: '/currentPassword', code: 'wrong_password', detail }]);
    }
    attempt.succeeded();
    const newHash = await this.passwords.hash(newPassword);
    await this.writer.run(async (transaction) => {
      await User.update({ passwordHash: newHash }, { where: { userId: person.userId }, transaction });
      await this.sessions.endAll(transaction, person.userId, person.sessionId);
      await this.audit.record(transaction, {
        actor: person.email,
        action: 'account.passwordChanged',
        subject: person.email,
        detail: null,
      });
    });
    this.sessions.forget(person.userId);
  }
}
