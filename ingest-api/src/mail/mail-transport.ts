import { Inject, Injectable } from '@nestjs/common';
import { createTransport } from 'nodemailer';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { LocalSmtpServer } from '../local-mailbox/local-smtp-server.js';

export interface OutgoingMail {
  messageId: string;
  to: string;
  subject: string;
  text: string;
  html: string;
  date: Date;
}

const CONNECT_MS = 10_000;
const SILENCE_MS = 30_000;
/** However slowly a server drips, a mail is over by then. */
export const LONGEST_SEND_MS = 60_000;

/** Hands mails to the SMTP server of the settings, or to the local mailbox. */
@Injectable()
export class MailTransport {
  constructor(
    @Inject(ENV) private readonly env: Env,
    private readonly localServer: LocalSmtpServer,
  ) {}

  /** Resolves when the server has taken the mail; rejects with its answer otherwise. */
  async send(mail: OutgoingMail): Promise<void> {
    const transport = createTransport({
      ...this.server(),
      connectionTimeout: CONNECT_MS,
      greetingTimeout: CONNECT_MS,
      socketTimeout: SILENCE_MS,
      disableFileAccess: true,
      disableUrlAccess: true,
    });
    try {
      await transport.sendMail({
        ...mail,
        from: this.env.mailFrom,
        headers: { 'Auto-Submitted': 'auto-generated' },
        signal: AbortSignal.timeout(LONGEST_SEND_MS),
      });
    } finally {
      transport.close();
    }
  }

  private server(): { url: string } | { host: string; port: number; secure: boolean; ignoreTLS: boolean } {
    if (this.env.mailTransport === 'smtp') return { url: this.env.smtpUrl! };
    return { host: '127.0.0.1', port: this.localServer.port, secure: false, ignoreTLS: true };
  }
}
