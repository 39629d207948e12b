import { DataTypes } from 'sequelize';
import { ID, type Migration, reference, TIMES } from './migration';

/** Diagnoses with the readings they used and the version of the engine. */
export const createDiagnoses: Migration = {
  name: '20261201100400-create-diagnoses',
  up: async (queries, transaction) => {
    await queries.createTable(
      'diagnoses',
      {
        id: ID,
        case_id: reference('cases', true, 'CASCADE'),
        input_hash: { type: DataTypes.STRING, allowNull: false },
        engine_version: { type: DataTypes.STRING, allowNull: false },
        reading_ids: { type: DataTypes.JSON, allowNull: false },
        result: { type: DataTypes.JSON, allowNull: false },
        ms: { type: DataTypes.INTEGER, allowNull: false },
        asked_by_id: reference('people'),
        ...TIMES,
      },
      { transaction },
    );
    await queries.addIndex('diagnoses', ['case_id', 'input_hash'], { transaction });
  },
  down: async (queries, transaction) => {
    await queries.dropTable('diagnoses', { transaction });
  },
};
