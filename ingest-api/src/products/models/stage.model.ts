import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'stages' })
export class Stage extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare stageId: number;
  @Column(DataType.INTEGER) declare productId: number;
  @Column(DataType.TEXT) declare name: string;
  /** 1 is the first stage a unit passes. */
  @Column(DataType.INTEGER) declare position: number;
  @Column(DataType.INTEGER) declare maxAttempts: number;
  /** First-pass yield wanted, as a share. */
  @Column(DataType.REAL) declare yieldTarget: number | null;
}
