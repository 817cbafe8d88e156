import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'job_people' })
export class JobPerson extends Model {
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare companyId: string;

  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare jobId: string;

  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare userId: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare assignedAt: Date;
}
