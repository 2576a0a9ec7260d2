import { IsEmail, IsOptional } from 'class-validator';
import type { KeptMail } from '../mailbox-files.js';

export class FindMailsDto {
  /**
   * Only mails to this address.
   * @example "quality@fernhollow.example"
   */
  @IsOptional()
  @IsEmail({ require_tld: false })
  to?: string;
}

export class MailboxItemDto {
  /** @example "1796025342010-9f86d081884c" */
  mailId!: string;
  to!: string[];
  from!: string;
  subject!: string;
  receivedAt!: string;
  messageId!: string;
}

export class MailboxPageDto {
  /** Everyone who got a mail, whatever the filter. */
  addresses!: string[];
  /** Newest first. */
  items!: MailboxItemDto[];
}

export class MailboxMailDto extends MailboxItemDto {
  text!: string;
  /** As text: show it in a sandboxed frame only. */
  html!: string | null;
}

export function toMailboxItem({ receivedAt, ...mail }: KeptMail): MailboxItemDto {
  return { ...mail, receivedAt: new Date(receivedAt).toISOString() };
}
