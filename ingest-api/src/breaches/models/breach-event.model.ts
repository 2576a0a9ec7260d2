import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** One result that broke the limit. */
@Table({ tableName: 'breach_events' })
export class BreachEvent extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare breachEventId: number;
  @Column(DataType.INTEGER) declare breachId: number;
  @Column(DataType.INTEGER) declare resultId: number;
  @Column(DataType.INTEGER) declare at: number;
  @Column(DataType.TEXT) declare text: string;
}
