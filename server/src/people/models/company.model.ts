import { LIMITS } from '@fairlead/shared';
import type { CompanySettings } from '@fairlead/shared';
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

  /** null: the defaults. Read through the parser: an older version may have written them. */
  @Column({ type: DataType.JSON, allowNull: true })
  declare settings: CompanySettings | null;

  @Column({ type: DataType.INTEGER.UNSIGNED, allowNull: false, defaultValue: 1 })
  declare settingsVersion: number;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;
}
