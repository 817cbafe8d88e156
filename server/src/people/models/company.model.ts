import { LIMITS } from '@fairlead/shared';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'companies' })
export class Company extends Model {
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare id: string;

  @Column({ type: DataType.STRING(LIMITS.companyName), allowNull: false })
  declare name: string;

  /** IANA name, for paper and "today". */
  @Column({ type: DataType.STRING(64), allowNull: false })
  declare timeZone: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;
}
