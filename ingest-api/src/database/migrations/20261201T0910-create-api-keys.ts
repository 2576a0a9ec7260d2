import type { Migration } from '../migrator.js';
import { runScript } from '../run-script.js';

/** Keys of the stations: a public prefix to look them up by, and the SHA-256 of the secret. */
export const createApiKeys: Migration = {
  name: '20261201T0910-create-api-keys',
  up: (context) =>
    runScript(context, [
      `CREATE TABLE api_keys (
        api_key_id INTEGER PRIMARY KEY,
        station_id INTEGER NOT NULL REFERENCES stations (station_id),
        prefix TEXT NOT NULL UNIQUE,
        secret_hash TEXT NOT NULL,
        label TEXT NOT NULL,
        practice INTEGER NOT NULL,
        created_by TEXT NOT NULL,
        created_at INTEGER NOT NULL,
        expires_at INTEGER,
        revoked_at INTEGER,
        last_used_at INTEGER
      ) STRICT`,
      `CREATE INDEX api_keys_station ON api_keys (station_id)`,
    ]),
  down: (context) => runScript(context, ['DROP TABLE api_keys']),
};
