import {
  BelongsTo,
  Column,
  DataType,
  ForeignKey,
  HasMany,
  Model,
  Table,
} from 'sequelize-typescript';
import type { AsFound, Netlist } from '../engine';
import { Family } from '../families/family.model';
import { Person } from '../people/person.model';
import { ConfirmedFault } from './confirmed-fault.model';

/** Where a case stands. */
export const CASE_STATES = [
  'waiting',
  'on-the-bench',
  'waiting-for-customer',
  'waiting-for-parts',
  'proof',
  'closed',
] as const;
export type CaseState = (typeof CASE_STATES)[number];

/** How a case ended. */
export const OUTCOMES = ['repaired', 'no-fault', 'not-repaired'] as const;
export type Outcome = (typeof OUTCOMES)[number];

/** One set on the bench. */
@Table({ tableName: 'cases' })
export class Case extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  /** Number on the bench card, such as 2026-0042. */
  @Column({ type: DataType.STRING, allowNull: false })
  declare number: string;

  /** What stands on the bench, in the shop's words. */
  @Column({ type: DataType.STRING, allowNull: false })
  declare setName: string;

  @Column({ type: DataType.TEXT, allowNull: false })
  declare complaint: string;

  @Column({ type: DataType.TEXT, allowNull: false, defaultValue: '' })
  declare earlierWork: string;

  @Column({ type: DataType.STRING, allowNull: false })
  declare state: CaseState;

  /** RMS line voltage measured that day; null counts as the design value. */
  @Column({ type: DataType.FLOAT, allowNull: true })
  declare lineVolts: number | null;

  @ForeignKey(() => Family)
  @Column({ type: DataType.INTEGER, allowNull: true })
  declare familyId: number | null;

  @BelongsTo(() => Family)
  declare family?: Family | null;

  @Column({ type: DataType.INTEGER, allowNull: true })
  declare familyVersion: number | null;

  /** The case's own copy, so that a later version of the family changes nothing here. */
  @Column({ type: DataType.JSON, allowNull: false })
  declare netlist: Netlist;

  @Column({ type: DataType.JSON, allowNull: false })
  declare asFound: AsFound[];

  /** Goes up with every change; the second of two people who change the same one is told. */
  @Column({ type: DataType.INTEGER, allowNull: false, defaultValue: 1 })
  declare version: number;

  @ForeignKey(() => Person)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare openedById: number;

  @BelongsTo(() => Person, 'openedById')
  declare openedBy?: Person;

  @ForeignKey(() => Person)
  @Column({ type: DataType.INTEGER, allowNull: true })
  declare assignedToId: number | null;

  @BelongsTo(() => Person, 'assignedToId')
  declare assignedTo?: Person | null;

  @Column({ type: DataType.STRING, allowNull: true })
  declare outcome: Outcome | null;

  @Column({ type: DataType.TEXT, allowNull: true })
  declare closingNote: string | null;

  @Column({ type: DataType.DATE, allowNull: true })
  declare closedAt: Date | null;

  @Column({ type: DataType.INTEGER, allowNull: true })
  declare closedById: number | null;

  @HasMany(() => ConfirmedFault)
  declare confirmedFaults?: ConfirmedFault[];

  declare readonly createdAt: Date;
  declare readonly updatedAt: Date;
}
