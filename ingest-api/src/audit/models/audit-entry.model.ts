import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** Append-only: triggers refuse to change or remove a row. */
@Table({ tableName: 'audit_entries' })
export class AuditEntry extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare auditEntryId: number;
  @Column(DataType.INTEGER) declare at: number;
  /** Mail address of the person, or `system`. */
  @Column(DataType.TEXT) declare actor: string;
  /** Dotted, e.g. `apiKey.created`. */
  @Column(DataType.TEXT) declare action: string;
  @Column(DataType.TEXT) declare subject: string;
  @Column(DataType.TEXT) declare detail: string | null;
}
