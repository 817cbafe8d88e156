import { LIMITS } from '@fairlead/shared';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'runs' })
export class Run extends Model {
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare companyId: string;

  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare id: string;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare jobId: string;

  @Column({ type: DataType.STRING(LIMITS.area), allowNull: false })
  declare area: string;

  @Column({ type: DataType.STRING(LIMITS.system), allowNull: false })
  declare system: string;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare currentRevisionId: string;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare createdBy: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;

  @Column({ type: DataType.DATE(3), allowNull: true })
  declare deletedAt: Date | null;
}
