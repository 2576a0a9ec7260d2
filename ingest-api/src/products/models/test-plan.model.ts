import { Column, DataType, Model, Table } from 'sequelize-typescript';
import { booleanColumn, jsonColumn } from '../../database/columns.js';

@Table({ tableName: 'test_plans' })
export class TestPlan extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare testPlanId: number;
  @Column(DataType.INTEGER) declare stageId: number;
  @Column(DataType.INTEGER) declare version: number;
  @Column(jsonColumn('loadVolts')) declare loadVolts: number[];
  @Column(DataType.REAL) declare referenceVolts: number;
  @Column(DataType.INTEGER) declare dwellMs: number;
  @Column(booleanColumn('repeatFirst')) declare repeatFirst: boolean;
  @Column(booleanColumn('upAndDown')) declare upAndDown: boolean;
  @Column(DataType.INTEGER) declare releasedAt: number;
  @Column(DataType.INTEGER) declare effectiveAt: number;
}
