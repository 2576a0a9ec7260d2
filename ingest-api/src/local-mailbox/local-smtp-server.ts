import { once } from 'node:events';
import type { AddressInfo } from 'node:net';
import { buffer } from 'node:stream/consumers';
import { Inject, Injectable, Logger, type OnApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { SMTPServer, type SMTPServerDataStream } from 'smtp-server';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { LiveService } from '../live/live.service.js';
import { MailboxFiles } from './mailbox-files.js';

const LARGEST_MAIL_BYTES = 5_000_000;

/**
 * Stands in for a mail server where mails shall reach nobody: takes what is sent to 127.0.0.1 and keeps it
 * as files. Runs only with the local mail transport.
 */
@Injectable()
export class LocalSmtpServer implements OnModuleInit, OnApplicationShutdown {
  private readonly logger = new Logger(LocalSmtpServer.name);
  private server: SMTPServer | null = null;

  constructor(
    @Inject(ENV) private readonly env: Env,
    private readonly files: MailboxFiles,
    private readonly live: LiveService,
  ) {}

  async onModuleInit(): Promise<void> {
    if (this.env.mailTransport !== 'local') return;
    await this.files.open();
    this.server = new SMTPServer({
      disabledCommands: ['AUTH', 'STARTTLS'],
      disableReverseLookup: true,
      size: LARGEST_MAIL_BYTES,
      closeTimeout: 1000,
      onData: (stream, _session, callback) => void this.take(stream).then(() => callback(), callback),
    });
    this.server.on('error', (error) =>
      this.logger.warn({ err: error }, 'The local mail server was disturbed'),
    );
    this.server.listen(0, '127.0.0.1');
    await once(this.server.server, 'listening');
  }

  /** The free port that it listens on. */
  get port(): number {
    return (this.server!.server.address() as AddressInfo).port;
  }

  async onApplicationShutdown(): Promise<void> {
    const { server } = this;
    if (server !== null) await new Promise<void>((resolve) => server.close(resolve));
  }

  private async take(stream: SMTPServerDataStream): Promise<void> {
    const source = await buffer(stream);
    if (stream.sizeExceeded) throw Object.assign(new Error('Too large'), { responseCode: 552 });
    const mailId = await this.files.keep(source);
    this.live.publish({ topic: 'mailbox', id: mailId });
  }
}
