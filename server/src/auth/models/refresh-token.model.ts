import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'refresh_tokens' })
export class RefreshToken extends Model {
  @Column({ type: DataType.CHAR(64), primaryKey: true })
  declare tokenHash: string;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare sessionId: string;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;

  /** When the next token of the family took its place. */
  @Column({ type: DataType.DATE(3), allowNull: true })
  declare supersededAt: Date | null;
}
