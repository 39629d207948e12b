import { DataTypes } from 'sequelize';
import { ID, type Migration, TIMES } from './migration';

/** Rules with their versions; the newest active version of each is the one that speaks. */
export const createRules: Migration = {
  name: '20261201100500-create-rules',
  up: async (queries, transaction) => {
    await queries.createTable(
      'rules',
      {
        id: ID,
        rule_key: { type: DataTypes.STRING, allowNull: false },
        pack: { type: DataTypes.STRING, allowNull: false },
        version: { type: DataTypes.INTEGER, allowNull: false },
        state: { type: DataTypes.STRING, allowNull: false },
        content: { type: DataTypes.JSON, allowNull: false },
        content_hash: { type: DataTypes.STRING, allowNull: false },
        ...TIMES,
      },
      { transaction },
    );
    await queries.addIndex('rules', ['rule_key', 'version'], { unique: true, transaction });
  },
  down: async (queries, transaction) => {
    await queries.dropTable('rules', { transaction });
  },
};
