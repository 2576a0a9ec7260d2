import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const fromTop = (path: string) => fileURLToPath(new URL(`../../../${path}`, import.meta.url));

/** The programs that a person starts, as they are built. */
export const programs = {
  server: fromTop('ingest-api/dist/main.js'),
  seeds: fromTop('seeds/dist/main.js'),
  stationSim: fromTop('station-sim/dist/main.js'),
  dashboard: fromTop('dashboard/dist/index.html'),
};

export function requireBuiltProduct(): void {
  const missing = Object.values(programs).filter((path) => !existsSync(path));
  if (missing.length > 0) throw new Error(`Not built: ${missing.join(', ')}. Run "npm run build" first.`);
}

/** The environment without what the test runner put there: the product shall run as people run it. */
export function plainEnvironment(settings: Record<string, string>): NodeJS.ProcessEnv {
  const { NODE_ENV: _nodeEnv, ...inherited } = process.env;
  const kept = Object.entries(inherited).filter(([name]) => !/^(AMPKEEP_|VITEST|TZ$)/.test(name));
  return { ...Object.fromEntries(kept), ...settings };
}

/** Runs one of the programs to its end. Rejects with its words when it fails. */
export function runProgram(
  script: string,
  words: readonly string[],
  settings: Record<string, string> = {},
): Promise<string> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, [script, ...words], { env: plainEnvironment(settings) });
    let said = '';
    const hear = (chunk: Buffer) => {
      said += chunk.toString();
    };
    child.stdout.on('data', hear);
    child.stderr.on('data', hear);
    child.once('error', reject);
    child.once('close', (code) =>
      code === 0 ? resolve(said) : reject(new Error(`${script} ended with ${code}:\n${said}`)),
    );
  });
}
