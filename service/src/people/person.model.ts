import { Column, DataType, Model, Table } from 'sequelize-typescript';
import type { Role } from '../common/policy';

/** Somebody who works in the shop. */
@Table({ tableName: 'people' })
export class Person extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.STRING, allowNull: false })
  declare name: string;

  /** In small letters; unique. */
  @Column({ type: DataType.STRING, allowNull: false, unique: true })
  declare email: string;

  @Column({ type: DataType.STRING, allowNull: false })
  declare role: Role;

  /** Null until an invitation is accepted. */
  @Column({ type: DataType.STRING, allowNull: true })
  declare passwordHash: string | null;

  @Column({ type: DataType.BOOLEAN, allowNull: false, defaultValue: false })
  declare isBlocked: boolean;

  /** SHA-256 of the invitation's token. */
  @Column({ type: DataType.STRING, allowNull: true })
  declare invitationHash: string | null;

  @Column({ type: DataType.DATE, allowNull: true })
  declare invitationExpiresAt: Date | null;
}
