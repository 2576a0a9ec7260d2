import { Column, DataType, Model, Table } from 'sequelize-typescript';
import { booleanColumn } from '../../database/columns.js';

@Table({ tableName: 'stations' })
export class Station extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare stationId: number;
  @Column(DataType.TEXT) declare name: string;
  @Column(DataType.TEXT) declare line: string;
  @Column(booleanColumn('active')) declare active: boolean;
  @Column(DataType.INTEGER) declare createdAt: number;
}
