import type { Migration } from '../migrator.js';
import { runScript } from '../run-script.js';

/** Breaches with their events, and the outbox that their mails leave from. */
export const createBreaches: Migration = {
  name: '20261201T0940-create-breaches',
  up: (context) =>
    runScript(context, [
      `CREATE TABLE breaches (
        breach_id INTEGER PRIMARY KEY,
        cause_key TEXT NOT NULL,
        stage_id INTEGER NOT NULL REFERENCES stages (stage_id),
        measure TEXT NOT NULL,
        state TEXT NOT NULL,
        opened_at INTEGER NOT NULL,
        last_event_at INTEGER NOT NULL,
        event_count INTEGER NOT NULL,
        latest_result_id INTEGER REFERENCES results (result_id),
        mailed_at INTEGER,
        acknowledged_at INTEGER,
        acknowledged_by TEXT,
        note TEXT,
        closed_at INTEGER,
        closed_by TEXT,
        cause TEXT,
        action TEXT
      ) STRICT`,
      `CREATE UNIQUE INDEX breaches_one_open ON breaches (cause_key) WHERE state <> 'closed'`,
      `CREATE INDEX breaches_state ON breaches (state, breach_id)`,
      `CREATE TABLE breach_events (
        breach_event_id INTEGER PRIMARY KEY,
        breach_id INTEGER NOT NULL REFERENCES breaches (breach_id),
        result_id INTEGER NOT NULL REFERENCES results (result_id),
        at INTEGER NOT NULL,
        text TEXT NOT NULL,
        UNIQUE (breach_id, result_id)
      ) STRICT`,
      `CREATE TABLE outbox (
        mail_id INTEGER PRIMARY KEY,
        message_id TEXT NOT NULL UNIQUE,
        breach_id INTEGER REFERENCES breaches (breach_id),
        recipient TEXT NOT NULL,
        subject TEXT NOT NULL,
        state TEXT NOT NULL,
        attempts INTEGER NOT NULL DEFAULT 0,
        created_at INTEGER NOT NULL,
        next_try_at INTEGER NOT NULL,
        sent_at INTEGER,
        last_error TEXT
      ) STRICT`,
      `CREATE INDEX outbox_due ON outbox (next_try_at) WHERE state = 'waiting'`,
      `CREATE INDEX outbox_breach ON outbox (breach_id)`,
    ]),
  down: (context) =>
    runScript(
      context,
      ['outbox', 'breach_events', 'breaches'].map((table) => `DROP TABLE ${table}`),
    ),
};
