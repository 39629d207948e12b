import { DataTypes } from 'sequelize';
import { ID, type Migration, reference, TIMES } from './migration';

/** People with their roles, what keeps them signed in, and invitations. */
export const createPeople: Migration = {
  name: '20261201100000-create-people',
  up: async (queries, transaction) => {
    await queries.createTable(
      'shop',
      {
        id: ID,
        name: { type: DataTypes.STRING, allowNull: false },
        ...TIMES,
      },
      { transaction },
    );
    await queries.createTable(
      'people',
      {
        id: ID,
        name: { type: DataTypes.STRING, allowNull: false },
        email: { type: DataTypes.STRING, allowNull: false, unique: true },
        role: { type: DataTypes.STRING, allowNull: false },
        password_hash: { type: DataTypes.STRING, allowNull: true },
        is_blocked: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
        invitation_hash: { type: DataTypes.STRING, allowNull: true, unique: true },
        invitation_expires_at: { type: DataTypes.DATE, allowNull: true },
        ...TIMES,
      },
      { transaction },
    );
    await queries.createTable(
      'refresh_tokens',
      {
        id: ID,
        person_id: reference('people', true, 'CASCADE'),
        chain: { type: DataTypes.STRING, allowNull: false },
        token_hash: { type: DataTypes.STRING, allowNull: false, unique: true },
        expires_at: { type: DataTypes.DATE, allowNull: false },
        replaced_at: { type: DataTypes.DATE, allowNull: true },
        revoked_at: { type: DataTypes.DATE, allowNull: true },
        ...TIMES,
      },
      { transaction },
    );
    await queries.addIndex('refresh_tokens', ['chain'], { transaction });
    await queries.addIndex('refresh_tokens', ['person_id'], { transaction });
  },
  down: async (queries, transaction) => {
    await queries.dropTable('refresh_tokens', { transaction });
    await queries.dropTable('people', { transaction });
    await queries.dropTable('shop', { transaction });
  },
};
