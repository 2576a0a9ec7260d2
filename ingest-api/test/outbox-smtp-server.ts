import { EventEmitter, once } from 'node:events';
import type { AddressInfo, Socket } from 'node:net';
import { text } from 'node:stream/consumers';
import { SMTPServer } from 'smtp-server';

/** `take`, `drop` (take it, then cut the line before the reply), `hang`, or an SMTP reply code to refuse with. */
export type Reply = 'take' | 'drop' | 'hang' | number;

interface Received {
  to: string;
  messageId: string;
}

/** A mail server that misbehaves on command: `rcpt` and `data` say how it answers next, then it takes everything. */
export class FaultySmtpServer {
  readonly received: Received[] = [];
  rcpt: Record<string, Reply> = {};
  readonly data: Reply[] = [];
  private readonly arrivals = new EventEmitter();
  private server: SMTPServer | null = null;
  private readonly sockets = new Set<Socket>();

  async listen(port = 0): Promise<number> {
    this.server = new SMTPServer({
      disabledCommands: ['AUTH', 'STARTTLS'],
      disableReverseLookup: true,
      closeTimeout: 1,
      onRcptTo: ({ address }, _session, callback) => {
        const reply = this.rcpt[address] ?? 'take';
        if (reply !== 'hang') callback(refusal(reply));
      },
      onData: (stream, session, callback) => {
        const [recipient] = session.envelope.rcptTo;
        void text(stream).then((source) => this.reply(recipient!.address, source, callback));
      },
    });
    // A dropped line is what some tests are about.
    this.server.on('error', () => undefined);
    this.server.server.on('connection', (socket: Socket) => this.sockets.add(socket));
    this.server.listen(port, '127.0.0.1');
    await once(this.server.server, 'listening');
    return (this.server.server.address() as AddressInfo).port;
  }

  async close(): Promise<void> {
    const { server } = this;
    this.server = null;
    if (server !== null) await new Promise<void>((resolve) => server.close(resolve));
  }

  /** Resolves once it has taken so many mails. */
  async hasTaken(count: number): Promise<void> {
    while (this.received.length < count) await once(this.arrivals, 'mail');
  }

  /** As new, on the same port. */
  async restart(port: number): Promise<void> {
    await this.close();
    this.received.length = 0;
    this.data.length = 0;
    this.rcpt = {};
    await this.listen(port);
  }

  private reply(to: string, source: string, callback: (error?: Error | null) => void): void {
    const reply = this.data.shift() ?? 'take';
    if (typeof reply === 'string') {
      this.received.push({ to, messageId: /^Message-ID: (.*)$/im.exec(source)![1]!.trim() });
      this.arrivals.emit('mail');
    }
    if (reply === 'drop') this.sockets.forEach((socket) => socket.destroy());
    else callback(refusal(reply));
  }
}

const refusal = (reply: Reply): Error | null =>
  typeof reply === 'number'
    ? Object.assign(new Error(`Told to answer ${reply}`), { responseCode: reply })
    : null;
