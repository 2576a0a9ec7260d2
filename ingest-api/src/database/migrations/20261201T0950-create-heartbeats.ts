import type { Migration } from '../migrator.js';
import { runScript } from '../run-script.js';

/** The last sign of life of each station and how far its clock was off. */
export const createHeartbeats: Migration = {
  name: '20261201T0950-create-heartbeats',
  up: (context) =>
    runScript(context, [
      `CREATE TABLE heartbeats (
        station_id INTEGER PRIMARY KEY REFERENCES stations (station_id),
        at INTEGER NOT NULL,
        clock_skew_ms INTEGER
      ) STRICT`,
    ]),
  down: (context) => runScript(context, ['DROP TABLE heartbeats']),
};
