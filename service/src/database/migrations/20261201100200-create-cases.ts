import { DataTypes } from 'sequelize';
import { ID, type Migration, reference, TIMES } from './migration';

/** Cases, what was found on the set, confirmed faults, and who acknowledged the cautions. */
export const createCases: Migration = {
  name: '20261201100200-create-cases',
  up: async (queries, transaction) => {
    await queries.createTable(
      'cases',
      {
        id: ID,
        number: { type: DataTypes.STRING, allowNull: false, unique: true },
        set_name: { type: DataTypes.STRING, allowNull: false },
        complaint: { type: DataTypes.TEXT, allowNull: false },
        earlier_work: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
        state: { type: DataTypes.STRING, allowNull: false },
        line_volts: { type: DataTypes.FLOAT, allowNull: true },
        family_id: reference('families', false),
        family_version: { type: DataTypes.INTEGER, allowNull: true },
        netlist: { type: DataTypes.JSON, allowNull: false },
        as_found: { type: DataTypes.JSON, allowNull: false },
        version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
        opened_by_id: reference('people'),
        assigned_to_id: reference('people', false),
        outcome: { type: DataTypes.STRING, allowNull: true },
        closing_note: { type: DataTypes.TEXT, allowNull: true },
        closed_at: { type: DataTypes.DATE, allowNull: true },
        closed_by_id: reference('people', false),
        ...TIMES,
      },
      { transaction },
    );
    await queries.addIndex('cases', ['state'], { transaction });
    await queries.addIndex('cases', ['family_id'], { transaction });
    await queries.createTable(
      'confirmed_faults',
      {
        id: ID,
        case_id: reference('cases', true, 'CASCADE'),
        part: { type: DataTypes.STRING, allowNull: false },
        mode: { type: DataTypes.STRING, allowNull: false },
        ...TIMES,
      },
      { transaction },
    );
    await queries.addIndex('confirmed_faults', ['case_id'], { transaction });
    await queries.createTable(
      'caution_acknowledgements',
      {
        id: ID,
        case_id: reference('cases', true, 'CASCADE'),
        person_id: reference('people', true, 'CASCADE'),
        ...TIMES,
      },
      { transaction },
    );
    await queries.addIndex('caution_acknowledgements', ['case_id', 'person_id'], {
      unique: true,
      transaction,
    });
  },
  down: async (queries, transaction) => {
    await queries.dropTable('caution_acknowledgements', { transaction });
    await queries.dropTable('confirmed_faults', { transaction });
    await queries.dropTable('cases', { transaction });
  },
};
