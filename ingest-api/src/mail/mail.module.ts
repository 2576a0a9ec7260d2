import { Module } from '@nestjs/common';
import { LocalMailboxModule } from '../local-mailbox/local-mailbox.module.js';
import { MailTransport } from './mail-transport.js';
import { Outbox } from './outbox.js';

@Module({
  imports: [LocalMailboxModule],
  providers: [MailTransport, Outbox],
  exports: [Outbox],
})
export class MailModule {}
