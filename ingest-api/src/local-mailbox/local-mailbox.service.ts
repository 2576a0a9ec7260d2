import { Inject, Injectable } from '@nestjs/common';
import { NotFoundError } from '../common/errors.js';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { type MailboxMailDto, type MailboxPageDto, toMailboxItem } from './dto/mailbox.dto.js';
import { MailboxFiles } from './mailbox-files.js';

@Injectable()
export class LocalMailboxService {
  constructor(
    @Inject(ENV) private readonly env: Env,
    private readonly files: MailboxFiles,
  ) {}

  list(to: string | undefined): MailboxPageDto {
    this.requireLocal();
    const mails = this.files.list();
    const wanted = to === undefined ? mails : mails.filter((mail) => mail.to.includes(to.toLowerCase()));
    return {
      addresses: [...new Set(mails.flatMap((mail) => mail.to))].sort(),
      items: wanted.map(toMailboxItem),
    };
  }

  async find(mailId: string): Promise<MailboxMailDto> {
    this.requireLocal();
    const found = await this.files.read(mailId);
    if (found === null) throw new NotFoundError('This mail');
    return { ...toMailboxItem(found.mail), text: found.text, html: found.html };
  }

  private requireLocal(): void {
    if (this.env.mailTransport !== 'local') throw new NotFoundError('The local mailbox');
  }
}
