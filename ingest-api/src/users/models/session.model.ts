import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** Server side of a signed-in browser: ending it acts at once, whatever the token says. */
@Table({ tableName: 'sessions' })
export class Session extends Model {
  @Column({ type: DataType.TEXT, primaryKey: true }) declare sessionId: string;
  @Column(DataType.INTEGER) declare userId: number;
  @Column(DataType.INTEGER) declare createdAt: number;
  @Column(DataType.INTEGER) declare expiresAt: number;
  @Column(DataType.INTEGER) declare endedAt: number | null;
}
