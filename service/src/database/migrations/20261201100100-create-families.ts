import { DataTypes } from 'sequelize';
import { ID, type Migration, reference, TIMES } from './migration';

/** Chassis families and the versions of their netlists. */
export const createFamilies: Migration = {
  name: '20261201100100-create-families',
  up: async (queries, transaction) => {
    await queries.createTable(
      'families',
      {
        id: ID,
        /** File it came from in netlists/, empty for families made in the shop. */
        slug: { type: DataTypes.STRING, allowNull: true, unique: true },
        name: { type: DataTypes.STRING, allowNull: false },
        kind: { type: DataTypes.STRING, allowNull: false },
        description: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        tags: { type: DataTypes.JSON, allowNull: false },
        ...TIMES,
      },
      { transaction },
    );
    await queries.createTable(
      'family_versions',
      {
        id: ID,
        family_id: reference('families', true, 'CASCADE'),
        version: { type: DataTypes.INTEGER, allowNull: false },
        netlist: { type: DataTypes.JSON, allowNull: false },
        note: { type: DataTypes.STRING, allowNull: false },
        content_hash: { type: DataTypes.STRING, allowNull: false },
        author_id: reference('people', false),
        ...TIMES,
      },
      { transaction },
    );
    await queries.addIndex('family_versions', ['family_id', 'version'], {
      unique: true,
      transaction,
    });
  },
  down: async (queries, transaction) => {
    await queries.dropTable('family_versions', { transaction });
    await queries.dropTable('families', { transaction });
  },
};
