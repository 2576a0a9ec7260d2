import type { AuditEntry } from '../models/audit-entry.model.js';

/** Something that was done, by whom and to what. */
export class AuditEntryDto {
  /** @example 118 */
  auditId!: number;

  /** @example "2026-11-30T08:21:04.500Z" */
  at!: string;

  /**
   * Mail address of the person, or `system`.
   * @example "rosalind.hart@fernhollow.example"
   */
  actor!: string;

  /** @example "apiKey.revoked" */
  action!: string;

  /** @example "north-1 k7m2p9qx" */
  subject!: string;

  /** @example "key found on a shared drive" */
  detail!: string | null;
}

/** Entries, newest first. */
export class AuditPageDto {
  items!: AuditEntryDto[];

  /**
   * Send it as `cursor` for the next page; null at the end.
   * @example "69"
   */
  nextCursor!: string | null;
}

export function toAuditEntryDto(entry: AuditEntry): AuditEntryDto {
  const { auditEntryId, at, actor, action, subject, detail } = entry;
  return { auditId: auditEntryId, at: new Date(at).toISOString(), actor, action, subject, detail };
}
