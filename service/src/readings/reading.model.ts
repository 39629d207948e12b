import { BelongsTo, Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import type { Meter, Reading, Seen, Take } from '../engine';
import { Case } from '../cases/case.model';
import { Person } from '../people/person.model';

/** One reading as entered; corrections replace it but never erase it. */
@Table({ tableName: 'readings' })
export class ReadingRow extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @ForeignKey(() => Case)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare caseId: number;

  /** Name the browser gave it, so that sending it twice enters it once. */
  @Column({ type: DataType.STRING, allowNull: true })
  declare clientId: string | null;

  @Column({ type: DataType.STRING, allowNull: false })
  declare take: Take;

  /** Take and place as one word. */
  @Column({ type: DataType.STRING, allowNull: false })
  declare place: string;

  @Column({ type: DataType.STRING, allowNull: true })
  declare red: string | null;

  @Column({ type: DataType.STRING, allowNull: true })
  declare black: string | null;

  @Column({ type: DataType.STRING, allowNull: true })
  declare part: string | null;

  /** A number as text, or OL. */
  @Column({ type: DataType.STRING, allowNull: true })
  declare value: string | null;

  @Column({ type: DataType.STRING, allowNull: true })
  declare seen: Seen | null;

  @Column({ type: DataType.JSON, allowNull: true })
  declare meter: Meter | null;

  @Column({ type: DataType.STRING, allowNull: false, defaultValue: '' })
  declare note: string;

  @ForeignKey(() => Person)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare takenById: number;

  @BelongsTo(() => Person)
  declare takenBy?: Person;

  @Column({ type: DataType.DATE, allowNull: true })
  declare replacedAt: Date | null;

  @Column({ type: DataType.INTEGER, allowNull: true })
  declare replacedById: number | null;

  @Column({ type: DataType.DATE, allowNull: true })
  declare withdrawnAt: Date | null;

  declare readonly createdAt: Date;
}

/** Take and place as one word: two readings with the same one replace each other. */
export function placeOf({ take, at, part }: Pick<Reading, 'take' | 'at' | 'part'>): string {
  return `${take} ${part ?? at?.join(' ') ?? ''}`;
}

/** A stored reading as the engine takes it. */
export function asReading({ take, red, black, part, value, seen, meter }: ReadingRow): Reading {
  return {
    take,
    ...(part === null ? {} : { part }),
    ...(red === null || black === null ? {} : { at: [red, black] as [string, string] }),
    ...(value === null ? {} : { value: value === 'OL' ? ('OL' as const) : Number(value) }),
    ...(seen === null ? {} : { seen }),
    ...(meter === null ? {} : { meter }),
  };
}
