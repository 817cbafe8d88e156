import { LIMITS } from '@fairlead/shared';
import type { RevisionState, RunDocument, Status, StripSummary, TradeSize } from '@fairlead/shared';
import { Column, DataType, Model, Table } from 'sequelize-typescript';

@Table({ tableName: 'run_revisions' })
export class RunRevision extends Model {
  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare companyId: string;

  @Column({ type: DataType.CHAR(36), primaryKey: true })
  declare id: string;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare runId: string;

  /** The job whose list shows this revision: the current one of a run that stands. */
  @Column({ type: DataType.CHAR(36), allowNull: true })
  declare listedJobId: string | null;

  @Column({ type: DataType.INTEGER.UNSIGNED, allowNull: false })
  declare number: number;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare state: RevisionState;

  /** The save counter behind `baseVersion`. */
  @Column({ type: DataType.INTEGER.UNSIGNED, allowNull: false })
  declare version: number;

  @Column({ type: DataType.JSON, allowNull: false })
  declare document: RunDocument;

  @Column({ type: DataType.STRING(32), allowNull: false })
  declare engineVersion: string;

  @Column({ type: DataType.STRING(LIMITS.tag), allowNull: false })
  declare tag: string;

  @Column({ type: DataType.STRING(LIMITS.title), allowNull: false })
  declare title: string;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare status: Status;

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare lengthInches: number | null;

  @Column({ type: DataType.DOUBLE, allowNull: false })
  declare degrees: number;

  @Column({ type: DataType.DOUBLE, allowNull: false })
  declare worstSectionDegrees: number;

  @Column({ type: DataType.DOUBLE, allowNull: false })
  declare remainingDegrees: number;

  @Column({ type: DataType.DOUBLE, allowNull: true })
  declare fillPercent: number | null;

  @Column({ type: DataType.INTEGER.UNSIGNED, allowNull: false })
  declare sections: number;

  @Column({ type: DataType.INTEGER.UNSIGNED, allowNull: false })
  declare pullPoints: number;

  @Column({ type: DataType.STRING(20), allowNull: false })
  declare racewayType: string;

  @Column({ type: DataType.STRING(20), allowNull: true })
  declare tradeSize: TradeSize | null;

  @Column({ type: DataType.STRING(LIMITS.label * 2), allowNull: false })
  declare fromLabel: string;

  @Column({ type: DataType.STRING(LIMITS.label * 2), allowNull: false })
  declare toLabel: string;

  @Column({ type: DataType.JSON, allowNull: false })
  declare strip: StripSummary;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare createdAt: Date;

  @Column({ type: DataType.DATE(3), allowNull: false })
  declare savedAt: Date;

  @Column({ type: DataType.CHAR(36), allowNull: false })
  declare savedBy: string;
}
