import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { ErrorPlace } from '../../common/errors.js';
import { booleanColumn, jsonColumn } from '../../database/columns.js';

/** A post that came with a valid key and could not be accepted, kept so that a person can mend it. */
@Table({ tableName: 'refused_posts' })
export class RefusedPost extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare refusedPostId: number;
  @Column(DataType.INTEGER) declare stationId: number;
  @Column(DataType.INTEGER) declare apiKeyId: number | null;
  @Column(DataType.INTEGER) declare status: number;
  @Column(DataType.TEXT) declare title: string;
  @Column(DataType.TEXT) declare detail: string;
  @Column(jsonColumn('errors')) declare errors: ErrorPlace[];
  @Column(DataType.TEXT) declare resultUuid: string | null;
  @Column(DataType.TEXT) declare partNumber: string | null;
  @Column(DataType.TEXT) declare serialNumber: string | null;
  @Column(DataType.TEXT) declare bodySha256: string;
  /** Gzipped; cut at the size cap when `truncated`. */
  @Column(DataType.BLOB) declare body: Buffer;
  @Column(DataType.INTEGER) declare bodyBytes: number;
  @Column(DataType.INTEGER) declare storedBytes: number;
  @Column(booleanColumn('truncated')) declare truncated: boolean;
  /** How often the same body came. */
  @Column(DataType.INTEGER) declare times: number;
  @Column(DataType.INTEGER) declare firstReceivedAt: number;
  @Column(DataType.INTEGER) declare lastReceivedAt: number;
}
