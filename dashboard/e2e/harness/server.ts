import { type ChildProcess, spawn } from 'node:child_process';
import { createInterface } from 'node:readline';
import { plainEnvironment, programs } from './built-product';

const PATIENCE_MS = 10_000;

/** A running Ampkeep with a data folder of its own. */
export interface Server {
  readonly url: string;
  readonly dataDir: string;
  /** Errors that it logged, over all its starts. */
  readonly loggedErrors: readonly string[];
  /** Starts it (again) on its port and data; resolves when it listens. */
  start(): Promise<void>;
  /** Ends it and waits until it is gone. */
  stop(signal?: 'SIGTERM' | 'SIGKILL'): Promise<void>;
}

export function aServer(dataDir: string, port: number): Server {
  const url = `http://localhost:${port}`;
  const loggedErrors: string[] = [];
  let running: ChildProcess | null = null;
  return {
    url,
    dataDir,
    loggedErrors,
    start: async () => {
      running = launch(dataDir, port, url);
      await listening(running, loggedErrors);
    },
    stop: async (signal = 'SIGTERM') => {
      if (running) await end(running, signal);
      running = null;
    },
  };
}

function launch(dataDir: string, port: number, url: string): ChildProcess {
  const child = spawn(process.execPath, [programs.server], {
    // Not where a developer's .env may lie.
    cwd: dataDir,
    env: plainEnvironment({
      AMPKEEP_MODE: 'demo',
      AMPKEEP_PORT: String(port),
      AMPKEEP_PUBLIC_URL: url,
      AMPKEEP_DATA_DIR: dataDir,
      AMPKEEP_LOG_LEVEL: 'error',
    }),
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  // A journey that is cut off leaves no server behind.
  const kill = () => child.kill('SIGKILL');
  process.once('exit', kill);
  child.once('close', () => process.off('exit', kill));
  return child;
}

/** Resolves when it says that it listens; whatever else it says at this log level is an error. */
function listening(child: ChildProcess, loggedErrors: string[]): Promise<void> {
  return new Promise((resolve, reject) => {
    const hear = (line: string) => {
      if (/^Ampkeep listens on /.test(line)) resolve();
      else loggedErrors.push(line);
    };
    if (child.stdout) createInterface({ input: child.stdout }).on('line', hear);
    if (child.stderr) createInterface({ input: child.stderr }).on('line', hear);
    child.once('error', reject);
    child.once('close', () => reject(new Error(`The server did not start:\n${loggedErrors.join('\n')}`)));
  });
}

function end(child: ChildProcess, signal: 'SIGTERM' | 'SIGKILL'): Promise<void> {
  return new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) return resolve();
    const force = setTimeout(() => child.kill('SIGKILL'), PATIENCE_MS);
    child.once('close', () => {
      clearTimeout(force);
      resolve();
    });
    child.kill(signal);
  });
}
