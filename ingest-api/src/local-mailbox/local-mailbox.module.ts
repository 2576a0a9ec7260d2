import { Module } from '@nestjs/common';
import { LocalMailboxController } from './local-mailbox.controller.js';
import { LocalMailboxService } from './local-mailbox.service.js';
import { LocalSmtpServer } from './local-smtp-server.js';
import { MailboxFiles } from './mailbox-files.js';

@Module({
  controllers: [LocalMailboxController],
  providers: [LocalMailboxService, LocalSmtpServer, MailboxFiles],
  exports: [LocalSmtpServer],
})
export class LocalMailboxModule {}
