import type { Role } from '@fairlead/shared';
import { BelongsTo, Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { User } from './user.model';

@Table({ tableName: 'memberships' })
export class Membership extends Model {
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare companyId: string;

  @ForeignKey(() => User)
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare userId: string;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare role: Role;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;

  @BelongsTo(() => User)
  declare user?: User;
}
