import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** The last sign of life of a station. */
@Table({ tableName: 'heartbeats' })
export class Heartbeat extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true }) declare stationId: number;
  @Column(DataType.INTEGER) declare at: number;
  /** Server minus station; null when the station didn't say its time. */
  @Column(DataType.INTEGER) declare clockSkewMs: number | null;
}
