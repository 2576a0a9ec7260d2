import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** An ammeter or voltmeter. The register wins on accuracy and calibration, a post on range and resolution. */
@Table({ tableName: 'instruments' })
export class Instrument extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare instrumentId: number;
  @Column(DataType.INTEGER) declare stationId: number | null;
  @Column(DataType.TEXT) declare kind: 'ammeter' | 'voltmeter';
  @Column(DataType.TEXT) declare serialNumber: string;
  @Column(DataType.TEXT) declare model: string | null;
  /** A or V, by kind. */
  @Column(DataType.REAL) declare range: number | null;
  @Column(DataType.REAL) declare resolution: number | null;
  @Column(DataType.REAL) declare readingAccuracyPercent: number | null;
  @Column(DataType.REAL) declare rangeAccuracyPercent: number | null;
  /** A day, `YYYY-MM-DD`. */
  @Column(DataType.TEXT) declare calibrationDueOn: string | null;
}
