import { DataTypes } from 'sequelize';
import { ID, type Migration, reference, TIMES } from './migration';

/** Meters of people, and readings: a correction replaces the earlier one but never erases it. */
export const createReadings: Migration = {
  name: '20261201100300-create-readings',
  up: async (queries, transaction) => {
    await queries.createTable(
      'meters',
      {
        id: ID,
        person_id: reference('people', true, 'CASCADE'),
        name: { type: DataTypes.STRING, allowNull: false },
        settings: { type: DataTypes.JSON, allowNull: false },
        ...TIMES,
      },
      { transaction },
    );
    await queries.createTable(
      'readings',
      {
        id: ID,
        case_id: reference('cases', true, 'CASCADE'),
        client_id: { type: DataTypes.STRING, allowNull: true },
        take: { type: DataTypes.STRING, allowNull: false },
        place: { type: DataTypes.STRING, allowNull: false },
        red: { type: DataTypes.STRING, allowNull: true },
        black: { type: DataTypes.STRING, allowNull: true },
        part: { type: DataTypes.STRING, allowNull: true },
        /** Number as text, so that OL fits beside it and nothing is rounded. */
        value: { type: DataTypes.STRING, allowNull: true },
        seen: { type: DataTypes.STRING, allowNull: true },
        meter: { type: DataTypes.JSON, allowNull: true },
        note: { type: DataTypes.STRING, allowNull: false, defaultValue: '' },
        taken_by_id: reference('people'),
        replaced_at: { type: DataTypes.DATE, allowNull: true },
        replaced_by_id: reference('readings', false),
        withdrawn_at: { type: DataTypes.DATE, allowNull: true },
        ...TIMES,
      },
      { transaction },
    );
    await queries.addIndex('readings', ['case_id', 'place'], { transaction });
    await queries.addIndex('readings', ['case_id', 'client_id'], { unique: true, transaction });
  },
  down: async (queries, transaction) => {
    await queries.dropTable('readings', { transaction });
    await queries.dropTable('meters', { transaction });
  },
};
