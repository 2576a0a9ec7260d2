import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A kept unit with known values that proves a station. */
@Table({ tableName: 'golden_units' })
export class GoldenUnit extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare goldenUnitId: number;
  @Column(DataType.INTEGER) declare productId: number;
  @Column(DataType.TEXT) declare serialNumber: string;
  /** A station that tests the product shall measure it at least this often. */
  @Column(DataType.INTEGER) declare checkHours: number;
}
