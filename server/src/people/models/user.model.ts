import { LIMITS } from '@fairlead/shared';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'users' })
export class User extends Model {
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare id: string;

  @Column({ type: DataType.STRING(LIMITS.personName), allowNull: false })
  declare name: string;

  @Column({ type: DataType.STRING(LIMITS.email), allowNull: false })
  declare email: string;

  @Column({ type: DataType.CHAR(60), allowNull: false })
  declare passwordHash: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;
}
