import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { Rule } from '../engine';

/** One version of a rule; the newest version of a key is the one that speaks. */
@Table({ tableName: 'rules' })
export class RuleRow extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  /** The rule's own id, the same through all its versions. */
  @Column({ type: DataType.STRING, allowNull: false })
  declare ruleKey: string;

  @Column({ type: DataType.STRING, allowNull: false })
  declare pack: string;

  @Column({ type: DataType.INTEGER, allowNull: false })
  declare version: number;

  @Column({ type: DataType.STRING, allowNull: false })
  declare state: 'active' | 'superseded' | 'retired';

  @Column({ type: DataType.JSON, allowNull: false })
  declare content: Rule;

  @Column({ type: DataType.STRING, allowNull: false })
  declare contentHash: string;

  declare readonly createdAt: Date;
}
