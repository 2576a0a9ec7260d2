import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'lots' })
export class Lot extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare lotId: number;
  @Column(DataType.INTEGER) declare productId: number;
  @Column(DataType.TEXT) declare name: string;
  @Column(DataType.TEXT) declare state: 'open' | 'held' | 'released' | 'scrapped';
}
