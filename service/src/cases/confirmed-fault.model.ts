import { Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import type { FaultMode } from '../engine';
import { Case } from './case.model';

/** A fault that was proved on a closed case; the family's priors are counted from these. */
@Table({ tableName: 'confirmed_faults' })
export class ConfirmedFault extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @ForeignKey(() => Case)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare caseId: number;

  @Column({ type: DataType.STRING, allowNull: false })
  declare part: string;

  @Column({ type: DataType.STRING, allowNull: false })
  declare mode: FaultMode;
}
