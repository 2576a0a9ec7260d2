import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { Limit } from '../../analysis/analysis.types.js';
import { jsonColumn } from '../../database/columns.js';

@Table({ tableName: 'limit_sets' })
export class LimitSet extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare limitSetId: number;
  @Column(DataType.INTEGER) declare stageId: number;
  @Column(DataType.INTEGER) declare version: number;
  @Column(jsonColumn('limits')) declare limits: Limit[];
  @Column(DataType.TEXT) declare releasedBy: string;
  @Column(DataType.INTEGER) declare releasedAt: number;
  @Column(DataType.INTEGER) declare effectiveAt: number;
}
