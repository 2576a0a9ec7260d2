import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** The post exactly as received, gzipped, with the SHA-256 of its RFC 8785 canonical form. */
@Table({ tableName: 'result_bodies' })
export class ResultBody extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true }) declare resultId: number;
  @Column(DataType.TEXT) declare canonicalSha256: string;
  @Column(DataType.BLOB) declare body: Buffer;
}
