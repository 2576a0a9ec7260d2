import type { Migration } from '../migrator.js';
import { runScript } from '../run-script.js';

/** What is made, how it is tested, against which limits, and on which stations. */
export const createCatalogue: Migration = {
  name: '20261201T0900-create-catalogue',
  up: (context) =>
    runScript(context, [
      `CREATE TABLE products (
        product_id INTEGER PRIMARY KEY,
        part_number TEXT NOT NULL UNIQUE,
        description TEXT NOT NULL,
        nominal_amps REAL NOT NULL,
        supply_volts REAL NOT NULL,
        compliance_low_volts REAL NOT NULL,
        compliance_high_volts REAL NOT NULL,
        compliance_tolerance REAL NOT NULL,
        direction TEXT NOT NULL,
        circuit_kind TEXT NOT NULL,
        has_emitter_resistors INTEGER NOT NULL DEFAULT 0,
        created_at INTEGER NOT NULL
      ) STRICT`,
      `CREATE TABLE stages (
        stage_id INTEGER PRIMARY KEY,
        product_id INTEGER NOT NULL REFERENCES products (product_id),
        name TEXT NOT NULL,
        position INTEGER NOT NULL,
        max_attempts INTEGER NOT NULL,
        yield_target REAL,
        UNIQUE (product_id, name),
        UNIQUE (product_id, position)
      ) STRICT`,
      `CREATE TABLE test_plans (
        test_plan_id INTEGER PRIMARY KEY,
        stage_id INTEGER NOT NULL REFERENCES stages (stage_id),
        version INTEGER NOT NULL,
        load_volts TEXT NOT NULL,
        reference_volts REAL NOT NULL,
        dwell_ms INTEGER NOT NULL,
        repeat_first INTEGER NOT NULL,
        up_and_down INTEGER NOT NULL,
        released_at INTEGER NOT NULL,
        effective_at INTEGER NOT NULL,
        UNIQUE (stage_id, version)
      ) STRICT`,
      `CREATE TABLE limit_sets (
        limit_set_id INTEGER PRIMARY KEY,
        stage_id INTEGER NOT NULL REFERENCES stages (stage_id),
        version INTEGER NOT NULL,
        limits TEXT NOT NULL,
        released_by TEXT NOT NULL,
        released_at INTEGER NOT NULL,
        effective_at INTEGER NOT NULL,
        UNIQUE (stage_id, version)
      ) STRICT`,
      `CREATE TABLE stations (
        station_id INTEGER PRIMARY KEY,
        name TEXT NOT NULL UNIQUE,
        line TEXT NOT NULL,
        active INTEGER NOT NULL DEFAULT 1,
        created_at INTEGER NOT NULL
      ) STRICT`,
      `CREATE TABLE instruments (
        instrument_id INTEGER PRIMARY KEY,
        station_id INTEGER REFERENCES stations (station_id),
        kind TEXT NOT NULL,
        serial_number TEXT NOT NULL,
        model TEXT,
        "range" REAL,
        resolution REAL,
        reading_accuracy_percent REAL,
        range_accuracy_percent REAL,
        calibration_due_on TEXT,
        UNIQUE (kind, serial_number)
      ) STRICT`,
      `CREATE TABLE golden_units (
        golden_unit_id INTEGER PRIMARY KEY,
        product_id INTEGER NOT NULL REFERENCES products (product_id),
        serial_number TEXT NOT NULL,
        check_hours INTEGER NOT NULL,
        UNIQUE (product_id, serial_number)
      ) STRICT`,
      `CREATE TABLE settings (name TEXT PRIMARY KEY, value TEXT NOT NULL) STRICT, WITHOUT ROWID`,
    ]),
  down: (context) =>
    runScript(
      context,
      [
        'settings',
        'golden_units',
        'instruments',
        'stations',
        'limit_sets',
        'test_plans',
        'stages',
        'products',
      ].map((table) => `DROP TABLE ${table}`),
    ),
};
