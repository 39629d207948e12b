import { Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import type { Meter } from '../engine';
import { Person } from '../people/person.model';

/** A meter of one person, remembered with its input and accuracy. */
@Table({ tableName: 'meters' })
export class MeterRow extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @ForeignKey(() => Person)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare personId: number;

  @Column({ type: DataType.STRING, allowNull: false })
  declare name: string;

  @Column({ type: DataType.JSON, allowNull: false })
  declare settings: Meter;
}
