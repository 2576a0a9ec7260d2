import { Worker } from 'node:worker_threads';

/** Plain JavaScript as text: runs alike from the built server and from the tests' TypeScript. */
const program = `
  const { parentPort, workerData } = require('node:worker_threads');
  const bcrypt = require(workerData);
  parentPort.on('message', ({ ticket, call, operands }) => {
    try { parentPort.postMessage({ ticket, outcome: bcrypt[call](...operands) }); }
    catch (error) { parentPort.postMessage({ ticket, failure: error.message }); }
  });
`;

interface Answer {
  ticket: number;
  outcome?: string | boolean;
  failure?: string;
}

interface Waiting {
  resolve: (outcome: string | boolean) => void;
  reject: (error: Error) => void;
}

/**
 * bcryptjs in a thread of its own: a hash takes hundreds of milliseconds of CPU, during which the main
 * thread goes on taking posts. Requests queue; the thread starts with the first.
 */
export class BcryptThread {
  private worker: Worker | null = null;
  private readonly waiting = new Map<number, Waiting>();
  private lastTicket = 0;

  get queueLength(): number {
    return this.waiting.size;
  }

  async hash(password: string, cost: number): Promise<string> {
    return (await this.ask('hashSync', [password, cost])) as string;
  }

  async compare(password: string, hash: string): Promise<boolean> {
    return (await this.ask('compareSync', [password, hash])) as boolean;
  }

  async stop(): Promise<void> {
    await this.worker?.terminate();
  }

  private ask(call: 'hashSync' | 'compareSync', operands: (string | number)[]): Promise<string | boolean> {
    this.worker ??= this.start();
    const ticket = ++this.lastTicket;
    // Only while someone waits may the thread keep the process alive.
    this.worker.ref();
    return new Promise((resolve, reject) => {
      this.waiting.set(ticket, { resolve, reject });
      this.worker?.postMessage({ ticket, call, operands });
    });
  }

  private start(): Worker {
    const worker = new Worker(program, { eval: true, workerData: require.resolve('bcryptjs') });
    worker.on('message', ({ ticket, outcome, failure }: Answer) => {
      const waiting = this.waiting.get(ticket);
      this.waiting.delete(ticket);
      if (this.waiting.size === 0) worker.unref();
      if (outcome === undefined) waiting?.reject(new Error(failure));
      else waiting?.resolve(outcome);
    });
    worker.on('error', (error: Error) => this.abandon(error));
    worker.on('exit', () => this.abandon(new Error('The thread that checks passwords has ended')));
    return worker;
  }

  private abandon(error: Error): void {
    this.worker = null;
    for (const { reject } of this.waiting.values()) reject(error);
    this.waiting.clear();
  }
}
