import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'units' })
export class Unit extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare unitId: number;
  @Column(DataType.INTEGER) declare productId: number;
  @Column(DataType.TEXT) declare serialNumber: string;
  @Column(DataType.INTEGER) declare lotId: number | null;
  @Column(DataType.INTEGER) declare latestResultId: number | null;
}
