import { existsSync } from 'node:fs';
import { readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { ApiKeysService } from '@ampkeep/ingest-api/dist/api-keys/api-keys.service.js';
import { stations } from '@ampkeep/station-sim/dist/circuit/stations.js';
import type { INestApplicationContext } from '@nestjs/common';

export type StationKeys = Readonly<Record<string, string>>;

export const stationKeyFile = (dataDir: string): string => join(dataDir, 'station-keys.json');

export const hasStationKeys = (dataDir: string): boolean => existsSync(stationKeyFile(dataDir));

/** The simulated stations' API keys: made once and kept beside the database, readable by its owner only. */
export async function stationKeys(app: INestApplicationContext, dataDir: string): Promise<StationKeys> {
  const file = stationKeyFile(dataDir);
  if (existsSync(file)) return JSON.parse(await readFile(file, 'utf8')) as StationKeys;
  const apiKeys = app.get(ApiKeysService, { strict: false });
  const keys: Record<string, string> = {};
  for (const { station } of stations) {
    const wanted = { label: 'simulated station', practice: false, expiresAt: null };
    keys[station] = (await apiKeys.create(station, wanted, 'system')).key;
  }
  await writeFile(file, `${JSON.stringify(keys, null, 2)}\n`, { mode: 0o600 });
  return keys;
}
