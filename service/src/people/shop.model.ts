import { Column, DataType, Model, Table } from 'sequelize-typescript';

/** The shop itself; there is one row. */
@Table({ tableName: 'shop' })
export class Shop extends Model {
  @Column({ type: DataType.INTEGER, primaryKey: true, autoIncrement: true })
  declare id: number;

  @Column({ type: DataType.STRING, allowNull: false })
  declare name: string;
}
