import { Column, DataType, HasMany, Model, Table } from 'sequelize-typescript';
import { FamilyVersion } from './family-version.model';

/** Kinds of set a family can be. */
export const SET_KINDS = ['radio', 'television', 'amplifier', 'instrument', 'other'] as const;
export type SetKind = (typeof SET_KINDS)[number];

/** A chassis family: sets that share one circuit. */
@Table({ tableName: 'families' })
export class Family extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  /** File in netlists/ it came from; null when it was made in the shop. */
  @Column({ type: DataType.STRING, allowNull: true })
  declare slug: string | null;

  @Column({ type: DataType.STRING, allowNull: false })
  declare name: string;

  @Column({ type: DataType.STRING, allowNull: false })
  declare kind: SetKind;

  @Column({ type: DataType.TEXT, allowNull: false, defaultValue: '' })
  declare description: string;

  @Column({ type: DataType.JSON, allowNull: false })
  declare tags: string[];

  @HasMany(() => FamilyVersion)
  declare versions?: FamilyVersion[];
}
