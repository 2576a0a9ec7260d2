import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { Role } from '../../auth/roles.js';
import { booleanColumn } from '../../database/columns.js';

@Table({ tableName: 'users' })
export class User extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true }) declare userId: number;
  /** Lower case; what a person signs in with. */
  @Column(DataType.TEXT) declare email: string;
  @Column(DataType.TEXT) declare displayName: string;
  @Column(DataType.TEXT) declare role: Role;
  @Column(DataType.TEXT) declare passwordHash: string;
  @Column(booleanColumn('active')) declare active: boolean;
  /** A demo account's password is public: real use refuses a database that holds one. */
  @Column(booleanColumn('demo')) declare demo: boolean;
  @Column(DataType.INTEGER) declare createdAt: number;
  @Column(DataType.INTEGER) declare lastSignInAt: number | null;
}
