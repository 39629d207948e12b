import { DataTypes } from 'sequelize';
import { ID, type Migration, TIMES } from './migration';

/** Tube and lamp types with their ratings and where each figure comes from. */
export const createPartsData: Migration = {
  name: '20261201100600-create-parts-data',
  up: async (queries, transaction) => {
    await queries.createTable(
      'part_types',
      {
        id: ID,
        kind: { type: DataTypes.STRING, allowNull: false },
        type: { type: DataTypes.STRING, allowNull: false },
        volts: { type: DataTypes.FLOAT, allowNull: false },
        amps: { type: DataTypes.FLOAT, allowNull: false },
        source: { type: DataTypes.STRING, allowNull: false },
        status: { type: DataTypes.STRING, allowNull: false },
        details: { type: DataTypes.JSON, allowNull: false },
        ...TIMES,
      },
      { transaction },
    );
    await queries.addIndex('part_types', ['kind', 'type'], { unique: true, transaction });
    await queries.addIndex('part_types', ['kind', 'volts', 'amps'], { transaction });
  },
  down: async (queries, transaction) => {
    await queries.dropTable('part_types', { transaction });
  },
};
