import {
  DataTypes,
  type ModelAttributeColumnOptions,
  type QueryInterface,
  type Transaction,
} from 'sequelize';

/** One change of the schema, with its way back. */
export interface Migration {
  name: string;
  up: (queries: QueryInterface, transaction: Transaction) => Promise<void>;
  down: (queries: QueryInterface, transaction: Transaction) => Promise<void>;
}

/** The primary key every table has. */
export const ID: ModelAttributeColumnOptions = {
  type: DataTypes.INTEGER,
  primaryKey: true,
  autoIncrement: true,
};

/** Times that Sequelize keeps by itself. */
export const TIMES: Record<string, ModelAttributeColumnOptions> = {
  created_at: { type: DataTypes.DATE, allowNull: false },
  updated_at: { type: DataTypes.DATE, allowNull: false },
};

/** A reference to a row of another table. */
export function reference(
  table: string,
  isNeeded = true,
  onDelete = 'RESTRICT',
): ModelAttributeColumnOptions {
  return {
    type: DataTypes.INTEGER,
    allowNull: !isNeeded,
    references: { model: table, key: 'id' },
    onDelete,
  };
}
