import type { Migration } from '../migrator.js';
import { runScript } from '../run-script.js';

/** Units and their lots, every accepted result with its body as received, and what was refused. */
export const createResults: Migration = {
  name: '20261201T0920-create-results',
  up: (context) =>
    runScript(context, [
      `CREATE TABLE lots (
        lot_id INTEGER PRIMARY KEY,
        product_id INTEGER NOT NULL REFERENCES products (product_id),
        name TEXT NOT NULL,
        state TEXT NOT NULL DEFAULT 'open',
        UNIQUE (product_id, name)
      ) STRICT`,
      `CREATE TABLE units (
        unit_id INTEGER PRIMARY KEY,
        product_id INTEGER NOT NULL REFERENCES products (product_id),
        serial_number TEXT NOT NULL,
        lot_id INTEGER REFERENCES lots (lot_id),
        latest_result_id INTEGER,
        UNIQUE (product_id, serial_number)
      ) STRICT`,
      `CREATE INDEX units_serial ON units (serial_number)`,
      `CREATE INDEX units_latest ON units (latest_result_id)`,
      `CREATE TABLE results (
        result_id INTEGER PRIMARY KEY,
        result_uuid TEXT NOT NULL UNIQUE,
        station_id INTEGER NOT NULL REFERENCES stations (station_id),
        api_key_id INTEGER REFERENCES api_keys (api_key_id),
        product_id INTEGER NOT NULL REFERENCES products (product_id),
        stage_id INTEGER NOT NULL REFERENCES stages (stage_id),
        unit_id INTEGER NOT NULL REFERENCES units (unit_id),
        lot_id INTEGER REFERENCES lots (lot_id),
        run_kind TEXT NOT NULL,
        outcome TEXT NOT NULL,
        counted INTEGER NOT NULL,
        attempt INTEGER,
        verdict TEXT NOT NULL,
        first_verdict TEXT NOT NULL,
        started_at INTEGER NOT NULL,
        finished_at INTEGER,
        sent_at INTEGER,
        received_at INTEGER NOT NULL,
        fixture TEXT,
        program_name TEXT,
        program_version TEXT,
        limit_set_version INTEGER,
        test_plan_version INTEGER,
        seeded INTEGER NOT NULL,
        voided_at INTEGER,
        conductance_siemens REAL,
        conductance_uncertainty REAL,
        limit_siemens REAL,
        impedance_ohms REAL,
        impedance_bound TEXT NOT NULL,
        reference_amps REAL,
        failed_measures TEXT NOT NULL,
        flags TEXT NOT NULL,
        judgement TEXT NOT NULL,
        answer TEXT NOT NULL
      ) STRICT`,
      `CREATE INDEX results_attempts ON results (unit_id, stage_id, started_at)`,
      `CREATE INDEX results_cohort ON results (started_at, stage_id, attempt, verdict) WHERE counted = 1`,
      `CREATE INDEX results_station ON results (station_id, result_id)`,
      `CREATE INDEX results_station_received ON results (station_id, received_at)`,
      `CREATE INDEX results_stage ON results (stage_id, result_id)`,
      `CREATE INDEX results_lot ON results (lot_id, result_id)`,
      `CREATE INDEX results_received ON results (received_at, result_id)`,
      `CREATE TABLE result_bodies (
        result_id INTEGER PRIMARY KEY REFERENCES results (result_id),
        canonical_sha256 TEXT NOT NULL,
        body BLOB NOT NULL
      ) STRICT`,
      `CREATE TABLE refused_posts (
        refused_post_id INTEGER PRIMARY KEY,
        station_id INTEGER NOT NULL REFERENCES stations (station_id),
        api_key_id INTEGER REFERENCES api_keys (api_key_id),
        status INTEGER NOT NULL,
        title TEXT NOT NULL,
        detail TEXT NOT NULL,
        errors TEXT NOT NULL,
        result_uuid TEXT,
        part_number TEXT,
        serial_number TEXT,
        body_sha256 TEXT NOT NULL,
        body BLOB NOT NULL,
        body_bytes INTEGER NOT NULL,
        stored_bytes INTEGER NOT NULL,
        truncated INTEGER NOT NULL,
        times INTEGER NOT NULL DEFAULT 1,
        first_received_at INTEGER NOT NULL,
        last_received_at INTEGER NOT NULL,
        UNIQUE (station_id, status, body_sha256)
      ) STRICT`,
      `CREATE INDEX refused_posts_last ON refused_posts (last_received_at, stored_bytes)`,
    ]),
  down: (context) =>
    runScript(
      context,
      ['refused_posts', 'result_bodies', 'results', 'units', 'lots'].map((table) => `DROP TABLE ${table}`),
    ),
};
