import { Column, DataType, Model, Table } from 'sequelize-typescript';
import { booleanColumn } from '../../database/columns.js';

@Table({ tableName: 'api_keys' })
export class ApiKey extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare apiKeyId: number;
  @Column(DataType.INTEGER) declare stationId: number;
  /** Public; shown in lists and used to look the key up. */
  @Column(DataType.TEXT) declare prefix: string;
  /** SHA-256 (hex) of the 256-bit secret: nothing to guess, so no slow hash is needed. */
  @Column(DataType.TEXT) declare secretHash: string;
  @Column(DataType.TEXT) declare label: string;
  @Column(booleanColumn('practice')) declare practice: boolean;
  @Column(DataType.TEXT) declare createdBy: string;
  @Column(DataType.INTEGER) declare createdAt: number;
  @Column(DataType.INTEGER) declare expiresAt: number | null;
  @Column(DataType.INTEGER) declare revokedAt: number | null;
  @Column(DataType.INTEGER) declare lastUsedAt: number | null;
}
