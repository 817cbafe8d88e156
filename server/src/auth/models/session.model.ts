import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'sessions' })
export class Session extends Model {
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare id: string;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare companyId: string;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare userId: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare lastUsedAt: Date;

  @Column({ type: DataType.DATE(3), allowNull: true })
  declare revokedAt: Date | null;
}
