import { LIMITS } from '@fairlead/shared';
import type { JobStatus } from '@fairlead/shared';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'jobs' })
export class Job extends Model {
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare companyId: string;

  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare id: string;

  @Column({ type: DataType.STRING(LIMITS.jobNumber), allowNull: false })
  declare number: string;

  @Column({ type: DataType.STRING(LIMITS.jobName), allowNull: false })
  declare name: string;

  @Column({ type: DataType.STRING(LIMITS.jobAddress), allowNull: false })
  declare address: string;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare status: JobStatus;

  /** YYYY-MM-DD. */
  @Column({ type: DataType.DATEONLY, allowNull: true })
  declare dueDate: string | null;

  @Column({ type: DataType.INTEGER.UNSIGNED, allowNull: false })
  declare version: number;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare createdBy: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare updatedAt: Date;

  @Column({ type: DataType.DATE(3), allowNull: true })
  declare deletedAt: Date | null;
}
