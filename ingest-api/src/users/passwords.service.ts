import { Inject, Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { truncates } from 'bcryptjs';
import { type ErrorPlace, TooManyRequestsError } from '../common/errors.js';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { BcryptThread } from './bcrypt-thread.js';

/**
 * bcrypt's cost, the logarithm of its rounds. 12: about a third of a second a guess on a common server.
 * The demo takes the least: its passwords are public, and it listens to its own machine alone.
 */
const bcryptCost = { serve: 12, demo: 4 } as const;

const LEAST_PASSWORD_CHARACTERS = 12;

const QUEUE_LIMIT = 40;

/**
 * What keeps a password from being taken; null when it may be.
 * bcrypt reads no more than 72 bytes, so a longer one would be weaker than it looks.
 */
export function passwordFault(password: string, pointer: string): ErrorPlace | null {
  if ([...password].length < LEAST_PASSWORD_CHARACTERS) {
    return {
      pointer,
      code: 'password_short',
      detail: `Must have at least ${LEAST_PASSWORD_CHARACTERS} characters.`,
    };
  }
  if (truncates(password)) {
    return { pointer, code: 'password_long', detail: 'Must fit into 72 bytes; take a shorter one.' };
  }
  return null;
}

/** Hashes and checks passwords with bcrypt. */
@Injectable()
export class PasswordsService implements OnApplicationShutdown {
  private readonly thread = new BcryptThread();
  private nobodysHash: Promise<string> | null = null;
  private readonly cost: number;

  constructor(@Inject(ENV) env: Pick<Env, 'mode'>) {
    this.cost = bcryptCost[env.mode];
  }

  hash(password: string): Promise<string> {
    return this.thread.hash(password, this.cost);
  }

  /**
   * Whether the password is that of the hash. Without a hash (no such account) it compares all the same
   * and answers false, so that the time taken doesn't tell which addresses have accounts.
   * @throws TooManyRequestsError when too many wait for their check already.
   */
  async matches(password: string, hash: string | null): Promise<boolean> {
    if (this.thread.queueLength >= QUEUE_LIMIT) {
      throw new TooManyRequestsError('Too many people are signing in at this moment. Try again soon.', 10);
    }
    this.nobodysHash ??= this.hash('a password that no account has');
    const same = await this.thread.compare(password, hash ?? (await this.nobodysHash));
    return same && hash !== null;
  }

  onApplicationShutdown(): Promise<void> {
    return this.thread.stop();
  }
}
