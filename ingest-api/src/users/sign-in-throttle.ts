import { Inject, Injectable } from '@nestjs/common';
import { TooManyRequestsError } from '../common/errors.js';
import { CLOCK, type Clock } from '../config/config.module.js';

interface Tally {
  failures: number;
  lastAt: number;
  pausedUntil: number;
}

const FIRST_PAUSE_MS = 15_000;
const LONGEST_PAUSE_MS = 15 * 60_000;
const FORGOTTEN_AFTER_MS = 60 * 60_000;
const TALLIES_KEPT = 10_000;

/** How many failures are free of a pause. A whole hall may share one network address. */
const freeFailures = { account: 5, address: 20 } as const;
type Kind = keyof typeof freeFailures;

export interface SignInAttempt {
  /** Take back what the attempt was counted as: it was no failure. */
  succeeded(): void;
}

/**
 * Slows the guessing of passwords, per account and per network address: after some failures each further
 * one doubles a pause in which nothing is checked, from 15 s up to 15 min. Kept in memory: a restart
 * forgives, which a guesser can't cause.
 */
@Injectable()
export class SignInThrottle {
  private readonly tallies = new Map<string, Tally>();

  constructor(@Inject(CLOCK) private readonly clock: Clock) {}

  /**
   * Counts an attempt as failed until it proves good: guesses sent side by side are counted like guesses
   * sent one after the other.
   * @throws TooManyRequestsError during a pause, with the seconds left.
   */
  begin(account: string, address: string): SignInAttempt {
    const keys: [Kind, string][] = [
      ['account', account],
      ['address', address],
    ];
    const pauseMs = Math.max(
      ...keys.map(([kind, name]) => this.tallyOf(kind, name).pausedUntil - this.clock()),
    );
    if (pauseMs > 0) {
      const seconds = Math.ceil(pauseMs / 1000);
      throw new TooManyRequestsError(`Too many failed sign-ins. Try again in ${seconds} s.`, seconds);
    }
    for (const [kind, name] of keys) this.countFailure(kind, name);
    return { succeeded: () => this.forgive(account, address) };
  }

  private tallyOf(kind: Kind, name: string): Tally {
    const tally = this.tallies.get(`${kind} ${name}`);
    const fresh = { failures: 0, lastAt: this.clock(), pausedUntil: 0 };
    return tally && this.clock() - tally.lastAt < FORGOTTEN_AFTER_MS ? tally : fresh;
  }

  private countFailure(kind: Kind, name: string): void {
    const now = this.clock();
    const failures = this.tallyOf(kind, name).failures + 1;
    const beyond = failures - freeFailures[kind];
    const pauseMs = beyond < 0 ? 0 : Math.min(FIRST_PAUSE_MS * 2 ** beyond, LONGEST_PAUSE_MS);
    this.keep(`${kind} ${name}`, { failures, lastAt: now, pausedUntil: now + pauseMs });
  }

  /** The account starts afresh; the address only gets this attempt back, or one's own account would reset it. */
  private forgive(account: string, address: string): void {
    this.tallies.delete(`account ${account}`);
    const tally = this.tallyOf('address', address);
    this.keep(`address ${address}`, { ...tally, failures: Math.max(tally.failures - 1, 0), pausedUntil: 0 });
  }

  /** Newest last; the oldest makes room. */
  private keep(key: string, tally: Tally): void {
    this.tallies.delete(key);
    this.tallies.set(key, tally);
    const oldest = this.tallies.keys().next();
    if (this.tallies.size > TALLIES_KEPT && !oldest.done) this.tallies.delete(oldest.value);
  }
}
