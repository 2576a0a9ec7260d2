import { setTimeout as delay } from 'node:timers/promises';
import {
  type BeforeApplicationShutdown,
  Inject,
  Injectable,
  Logger,
  type OnApplicationBootstrap,
  type OnModuleDestroy,
} from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import type { Sequelize } from 'sequelize-typescript';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { Writer } from '../database/writer.js';
import { LiveService } from '../live/live.service.js';
import { renderBreachMail, type RenderedMail } from './breach-mail.js';
import { loadBreachMail } from './breach-mail.queries.js';
import { readFailure } from './delivery-failure.js';
import { LONGEST_SEND_MS, MailTransport } from './mail-transport.js';
import {
  claimDueMails,
  type ClaimedMail,
  hasDueMail,
  markFailed,
  markForRetry,
  markSent,
} from './outbox.queries.js';
import { GIVE_UP_AFTER_DAYS, isGivenUp, pauseBeforeRetry } from './retry-pause.js';

const LOOK_EVERY_MS = 5000;
const SHUTDOWN_WAIT_MS = 3000;
/** Sent side by side: a mail that hangs takes up one place and keeps no other waiting. */
const SIDE_BY_SIDE = 16;
/** Longer than any sending takes: nobody takes a mail that is still on its way. */
const CLAIM_MS = 2 * LONGEST_SEND_MS;

/**
 * Sends what waits in the outbox. Every mail gets out at least once, always with the same Message-ID; twice
 * only when the connection or this process dies between the server's taking it and our mark.
 */
@Injectable()
export class Outbox implements OnApplicationBootstrap, OnModuleDestroy, BeforeApplicationShutdown {
  private readonly logger = new Logger(Outbox.name);
  private readonly underWay = new Set<Promise<void>>();
  private starting: Promise<void> = Promise.resolve();
  private nextStart: Promise<void> | null = null;
  private timer: NodeJS.Timeout | null = null;
  private stopping = false;

  constructor(
    private readonly writer: Writer,
    private readonly transport: MailTransport,
    private readonly live: LiveService,
    @InjectConnection() private readonly sequelize: Sequelize,
    @Inject(ENV) private readonly env: Env,
    @Inject(CLOCK) private readonly clock: Clock,
  ) {}

  onApplicationBootstrap(): void {
    this.timer = setInterval(() => this.wake(), LOOK_EVERY_MS).unref();
  }

  /** Says that a mail was committed, so that it leaves now and not at the next look. */
  wake(): void {
    void this.startDue();
  }

  /** Resolves when all that is due was tried. Never rejects: faults stand with the mails and in the log. */
  async deliverDue(): Promise<void> {
    await this.startDue();
    while (this.underWay.size > 0) {
      await Promise.all(this.underWay);
      await this.startDue();
    }
  }

  onModuleDestroy(): void {
    this.stopping = true;
    if (this.timer !== null) clearInterval(this.timer);
  }

  /** Waits a little for mails on their way, so that they are marked before the database closes. */
  async beforeApplicationShutdown(): Promise<void> {
    await Promise.race([Promise.all(this.underWay), delay(SHUTDOWN_WAIT_MS, undefined, { ref: false })]);
  }

  /** One at a time; whoever asks while one runs shares the next, which sees what was committed since. */
  private startDue(): Promise<void> {
    this.nextStart ??= this.starting.then(() => {
      this.nextStart = null;
      this.starting = this.claimAndStart().catch((error: unknown) => {
        this.logger.error({ err: error }, 'The outbox could not be worked through; it is looked at again');
      });
      return this.starting;
    });
    return this.nextStart;
  }

  /** Fills the free places; each mail that is done with makes room for the next. */
  private async claimAndStart(): Promise<void> {
    while (!this.stopping && this.underWay.size < SIDE_BY_SIDE && (await hasDueMail(this.clock()))) {
      const now = this.clock();
      const free = SIDE_BY_SIDE - this.underWay.size;
      const claimed = await this.writer.run((transaction) =>
        claimDueMails(transaction, now, now + CLAIM_MS, free),
      );
      for (const mail of claimed) this.start(mail);
    }
  }

  private start(mail: ClaimedMail): void {
    const delivery = this.deliver(mail).finally(() => {
      this.underWay.delete(delivery);
      this.wake();
    });
    this.underWay.add(delivery);
  }

  private async deliver(mail: ClaimedMail): Promise<void> {
    try {
      await this.send(mail);
    } catch (error) {
      await this.noteFailure(mail, error);
      return;
    }
    await this.mark(mail, () =>
      this.writer.run((transaction) => markSent(transaction, mail.mailId, this.clock())),
    );
  }

  private async send(mail: ClaimedMail): Promise<void> {
    const { messageId, recipient, subject } = mail;
    const { text, html } = await this.render(mail);
    await this.transport.send({
      messageId,
      to: recipient,
      subject,
      text,
      html,
      date: new Date(this.clock()),
    });
  }

  private async render({ breachId, mailId }: ClaimedMail): Promise<RenderedMail> {
    if (breachId === null) throw new Error(`Mail ${mailId} is about nothing`);
    return renderBreachMail(await loadBreachMail(this.sequelize, breachId), this.env);
  }

  private async noteFailure(mail: ClaimedMail, error: unknown): Promise<void> {
    const { mailId, attempts, createdAt } = mail;
    const { permanent, text } = readFailure(error);
    const nextTryAt = this.clock() + pauseBeforeRetry(attempts, Math.random());
    const givenUp = isGivenUp(createdAt, nextTryAt);
    const note = givenUp && !permanent ? `Given up after ${GIVE_UP_AFTER_DAYS} days. ${text}` : text;
    const final = permanent || givenUp;
    this.logger.warn(
      { mailId, attempts, reason: text },
      final ? 'A mail failed for good' : 'A mail has to be sent again',
    );
    await this.mark(mail, () =>
      this.writer.run((transaction) =>
        final ? markFailed(transaction, mailId, note) : markForRetry(transaction, mailId, nextTryAt, note),
      ),
    );
  }

  /** A mark that can't be written leaves the mail claimed: it is due again when the claim ends. */
  private async mark(mail: ClaimedMail, write: () => Promise<void>): Promise<void> {
    try {
      await write();
      if (mail.breachId !== null) this.live.publish({ topic: 'breaches', id: String(mail.breachId) });
    } catch (error) {
      this.logger.error({ err: error, mailId: mail.mailId }, "What became of a mail couldn't be noted");
    }
  }
}
