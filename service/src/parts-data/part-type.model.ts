import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** A tube or lamp type with its rating and where the figures come from. */
@Table({ tableName: 'part_types' })
export class PartType extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.STRING, allowNull: false })
  declare kind: 'tube' | 'lamp';

  @Column({ type: DataType.STRING, allowNull: false })
  declare type: string;

  @Column({ type: DataType.FLOAT, allowNull: false })
  declare volts: number;

  @Column({ type: DataType.FLOAT, allowNull: false })
  declare amps: number;

  @Column({ type: DataType.STRING, allowNull: false })
  declare source: string;

  @Column({ type: DataType.STRING, allowNull: false })
  declare status: string;

  /** Role, pins, base, notes and the like. */
  @Column({ type: DataType.JSON, allowNull: false })
  declare details: Record<string, unknown>;
}
