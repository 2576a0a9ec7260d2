import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { programs, runProgram } from './built-product';
import type { Server } from './server';

export type StationKeys = Record<string, string>;

const keyFile = (server: Server) => join(server.dataDir, 'station-keys.json');

/** The API keys of the demonstration's stations. */
export const stationKeys = async (server: Server): Promise<StationKeys> =>
  JSON.parse(await readFile(keyFile(server), 'utf8')) as StationKeys;

/** Lets the simulated stations post, with the program's own options. */
export async function simulate(server: Server, options: Record<string, string>): Promise<void> {
  const all = {
    'key-file': keyFile(server),
    spool: join(server.dataDir, 'station-sim.spool.ndjson'),
    url: server.url,
    ...options,
  };
  const words = Object.entries(all).map(([name, value]) => `--${name}=${value}`);
  await runProgram(programs.stationSim, ['--quiet', ...words]);
}

/** One station posts one unit whose output impedance is clearly too low. */
export const postFailingUnit = (server: Server): Promise<void> =>
  simulate(server, { scenario: 'one-fail', stations: '1', seed: 'journey' });

/** Posts a body as a station does. */
export const post = (server: Server, key: string, body: string): Promise<Response> =>
  fetch(`${server.url}/api/v1/results`, {
    method: 'POST',
    headers: { 'X-API-Key': key, 'Content-Type': 'application/json' },
    body,
  });
