import { BelongsTo, Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import type { Netlist } from '../engine';
import { Person } from '../people/person.model';
import { Family } from './family.model';

/** One version of a family's netlist; versions are never changed. */
@Table({ tableName: 'family_versions' })
export class FamilyVersion extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @ForeignKey(() => Family)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare familyId: number;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare version: number;

  @Column({ type: DataType.JSON, allowNull: false })
  declare netlist: Netlist;

  /** Why this version was made. */
  @Column({ type: DataType.STRING, allowNull: false })
  declare note: string;

  @Column({ type: DataType.STRING, allowNull: false })
  declare contentHash: string;

  /** Null for versions that came with the project. */
  @ForeignKey(() => Person)
  @Column({ type: DataType.INTEGER, allowNull: true })
  declare authorId: number | null;

  @BelongsTo(() => Person)
  declare author?: Person | null;

  declare readonly createdAt: Date;
}
