import { Column, DataType, Model, Table } from 'sequelize-typescript';

export const mailStates = ['waiting', 'sent', 'failed'] as const;
export type MailState = (typeof mailStates)[number];

/** A mail that waits, was sent, or was given up. Its text is made when it is sent; its Message-ID never changes. */
@Table({ tableName: 'outbox' })
export class OutboxMail extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare mailId: number;
  @Column(DataType.TEXT) declare messageId: string;
  @Column(DataType.INTEGER) declare breachId: number | null;
  @Column(DataType.TEXT) declare recipient: string;
  @Column(DataType.TEXT) declare subject: string;
  @Column(DataType.TEXT) declare state: MailState;
  @Column(DataType.INTEGER) declare attempts: number;
  @Column(DataType.INTEGER) declare createdAt: number;
  @Column(DataType.INTEGER) declare nextTryAt: number;
  @Column(DataType.INTEGER) declare sentAt: number | null;
  @Column(DataType.TEXT) declare lastError: string | null;
}
