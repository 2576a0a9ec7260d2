import type { Migration } from '../migrator.js';
import { runScript } from '../run-script.js';

/** Accounts, their sessions, and the audit trail, whose rows can be neither changed nor removed. */
export const createPeople: Migration = {
  name: '20261201T0930-create-people',
  up: (context) =>
    runScript(context, [
      `CREATE TABLE users (
        user_id INTEGER PRIMARY KEY,
        email TEXT NOT NULL UNIQUE,
        display_name TEXT NOT NULL,
        role TEXT NOT NULL,
        password_hash TEXT NOT NULL,
        active INTEGER NOT NULL DEFAULT 1,
        demo INTEGER NOT NULL DEFAULT 0,
        created_at INTEGER NOT NULL,
        last_sign_in_at INTEGER
      ) STRICT`,
      `CREATE TABLE sessions (
        session_id TEXT PRIMARY KEY,
        user_id INTEGER NOT NULL REFERENCES users (user_id),
        created_at INTEGER NOT NULL,
        expires_at INTEGER NOT NULL,
        ended_at INTEGER
      ) STRICT, WITHOUT ROWID`,
      `CREATE INDEX sessions_user ON sessions (user_id)`,
      `CREATE TABLE audit_entries (
        audit_entry_id INTEGER PRIMARY KEY AUTOINCREMENT,
        at INTEGER NOT NULL,
        actor TEXT NOT NULL,
        action TEXT NOT NULL,
        subject TEXT NOT NULL,
        detail TEXT
      ) STRICT`,
      `CREATE TRIGGER audit_entries_keep_rows BEFORE DELETE ON audit_entries
        BEGIN SELECT RAISE(ABORT, 'audit entries are append-only'); END`,
      `CREATE TRIGGER audit_entries_keep_text BEFORE UPDATE ON audit_entries
        BEGIN SELECT RAISE(ABORT, 'audit entries are append-only'); END`,
    ]),
  down: (context) =>
    runScript(
      context,
      ['audit_entries', 'sessions', 'users'].map((table) => `DROP TABLE ${table}`),
    ),
};
