import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { CircuitKind } from '../../analysis/analysis.types.js';
import { booleanColumn } from '../../database/columns.js';

@Table({ tableName: 'products' })
export class Product extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare productId: number;
  @Column(DataType.TEXT) declare partNumber: string;
  @Column(DataType.TEXT) declare description: string;
  @Column(DataType.REAL) declare nominalAmps: number;
  @Column(DataType.REAL) declare supplyVolts: number;
  @Column(DataType.REAL) declare complianceLowVolts: number;
  @Column(DataType.REAL) declare complianceHighVolts: number;
  /** τ as a fraction. */
  @Column(DataType.REAL) declare complianceTolerance: number;
  @Column(DataType.TEXT) declare direction: 'source' | 'sink';
  @Column(DataType.TEXT) declare circuitKind: CircuitKind;
  @Column(booleanColumn('hasEmitterResistors')) declare hasEmitterResistors: boolean;
  @Column(DataType.INTEGER) declare createdAt: number;
}
