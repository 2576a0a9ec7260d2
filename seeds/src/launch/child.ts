import { type ChildProcess, spawn } from 'node:child_process';
import { createInterface } from 'node:readline';

/** A Node program that runs beside the launcher. */
export interface Child {
  /** Resolves at the first line on its stdout that matches; rejects when it ends before that. */
  saying(pattern: RegExp): Promise<void>;
  /** Resolves with what it said last once it has ended. */
  readonly ended: Promise<string>;
  /** Asks it to end and waits; after `patienceMs` it is ended by force. */
  stop(patienceMs: number): Promise<void>;
}

export interface ChildOptions {
  script: string;
  arguments?: readonly string[];
  variables?: Readonly<Record<string, string>>;
  cwd: string;
}

export function startChild(options: ChildOptions): Child {
  const child = spawn(process.execPath, [options.script, ...(options.arguments ?? [])], {
    cwd: options.cwd,
    env: { ...process.env, ...options.variables },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const listeners = new Set<(line: string) => void>();
  let lastLine = '';
  const hear = (line: string) => {
    lastLine = line;
    for (const listener of listeners) listener(line);
  };
  createInterface({ input: child.stdout }).on('line', hear);
  createInterface({ input: child.stderr }).on('line', (line) => {
    console.error(line);
    hear(line);
  });
  const ended = new Promise<string>((resolve) => {
    child.once('close', () => resolve(lastLine));
    child.once('error', (error) => resolve(error.message));
  });
  return {
    ended,
    saying: (pattern) =>
      new Promise((resolve, reject) => {
        const listener = (line: string) => {
          if (!pattern.test(line)) return;
          listeners.delete(listener);
          resolve();
        };
        listeners.add(listener);
        void ended.then((line) => reject(new Error(line || 'It ended without a word')));
      }),
    stop: (patienceMs) => stopChild(child, ended, patienceMs),
  };
}

async function stopChild(child: ChildProcess, ended: Promise<string>, patienceMs: number): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  child.kill('SIGTERM');
  const force = setTimeout(() => child.kill('SIGKILL'), patienceMs);
  await ended;
  clearTimeout(force);
}
