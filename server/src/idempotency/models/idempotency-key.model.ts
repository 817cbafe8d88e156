import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'idempotency_keys' })
export class IdempotencyKey extends Model {
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare companyId: string;

  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare userId: string;

  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare idempotencyKey: string;

  @Column({ type: DataType.STRING(200), allowNull: false })
  declare route: string;

  @Column({ type: DataType.CHAR(64), allowNull: false })
  declare requestHash: string;

  /** NULL only inside the transaction that is still working. */
  @Column({ type: DataType.SMALLINT.UNSIGNED, allowNull: true })
  declare status: number | null;

  /** The answer's JSON, deflated; NULL for an answer without a body. */
  @Column({ type: DataType.BLOB('medium'), allowNull: true })
  declare answer: Buffer | null;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;
}
