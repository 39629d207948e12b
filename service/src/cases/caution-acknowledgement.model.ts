import { Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { Person } from '../people/person.model';
import { Case } from './case.model';

/** That a person has read the cautions of a case, and when. */
@Table({ tableName: 'caution_acknowledgements' })
export class CautionAcknowledgement extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @ForeignKey(() => Case)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare caseId: number;

  @ForeignKey(() => Person)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare personId: number;

  declare readonly createdAt: Date;
}
