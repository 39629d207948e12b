import { Column, DataType, ForeignKey, Model, Table } from 'sequelize-typescript';
import { Person } from '../people/person.model';

/** One link of the chain that keeps a device signed in; only its digest is kept. */
@Table({ tableName: 'refresh_tokens' })
export class RefreshToken extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @ForeignKey(() => Person)
  @Column({ type: DataType.INTEGER, allowNull: false })
  declare personId: number;

  /** All tokens that came from one sign-in share it. */
  @Column({ type: DataType.STRING, allowNull: false })
  declare chain: string;

  @Column({ type: DataType.STRING, allowNull: false })
  declare tokenHash: string;

  @Column({ type: DataType.DATE, allowNull: false })
  declare expiresAt: Date;

  /** When the next one of the chain was handed out. */
  @Column({ type: DataType.DATE, allowNull: true })
  declare replacedAt: Date | null;

  @Column({ type: DataType.DATE, allowNull: true })
  declare revokedAt: Date | null;
}
