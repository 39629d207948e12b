import { Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { Case } from '../cases/case.model';
import type { DiagnosisResult } from '../engine';
import { Person } from '../people/person.model';

/** A ranking with the readings it used and the engine that made it. */
@Table({ tableName: 'diagnoses' })
export class DiagnosisRow extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @ForeignKey(() => Case)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare caseId: number;

  /** Digest of everything that went in: the same again gets the same answer without work. */
  @Column({ type: DataType.STRING, allowNull: false })
  declare inputHash: string;

  @Column({ type: DataType.STRING, allowNull: false })
  declare engineVersion: string;

  @Column({ type: DataType.JSON, allowNull: false })
  declare readingIds: number[];

  @Column({ type: DataType.JSON, allowNull: false })
  declare result: DiagnosisResult;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare ms: number;

  @ForeignKey(() => Person)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare askedById: number;

  declare readonly createdAt: Date;
}
