import { ApiProperty } from '@nestjs/swagger';
import { type MailState, mailStates, type OutboxMail } from '../../mail/models/outbox-mail.model.js';
import { RunItemDto } from '../../results/dto/run-item.dto.js';
import { BreachDto } from './breach.dto.js';

/** A result that broke the limit. */
export class BreachEventDto {
  at!: string;
  /**
   * The judging in words.
   * @example "Output impedance is 3.1 MΩ (3.0 to 3.2 MΩ); at least 5 MΩ is required, so it fails."
   */
  text!: string;
  run!: RunItemDto;
}

/** A mail about the breach. */
export class OutboxMailDto {
  mailId!: number;
  /** @example "quality@fernhollow.example" */
  to!: string;
  subject!: string;
  @ApiProperty({ enum: mailStates })
  state!: MailState;
  /** Times it was handed to the mail server. */
  attempts!: number;
  createdAt!: string;
  sentAt!: string | null;
  /** What the mail server said to the last try. */
  lastError!: string | null;
}

export class BreachDetailDto extends BreachDto {
  /** Newest first, up to 50. */
  events!: BreachEventDto[];
  /** Newest first. */
  mails!: OutboxMailDto[];
}

export function toOutboxMailDto(mail: OutboxMail): OutboxMailDto {
  return {
    mailId: mail.mailId,
    to: mail.recipient,
    subject: mail.subject,
    state: mail.state,
    attempts: mail.attempts,
    createdAt: new Date(mail.createdAt).toISOString(),
    sentAt: mail.sentAt === null ? null : new Date(mail.sentAt).toISOString(),
    lastError: mail.lastError,
  };
}
