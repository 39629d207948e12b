import type { Sequelize } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import { MIGRATIONS } from './migrations';

/**
 * Brings the schema up to date. Migrations are imported, not read from a folder, so that they run
 * from the built service and under tests alike.
 *
 * @returns names of the migrations that ran.
 */
export async function runMigrations(sequelize: Sequelize): Promise<string[]> {
  const umzug = new Umzug({
    migrations: MIGRATIONS.map(({ name, up, down }) => ({
      name,
      up: () =>
        sequelize.transaction((transaction) => up(sequelize.getQueryInterface(), transaction)),
      down: () =>
        sequelize.transaction((transaction) => down(sequelize.getQueryInterface(), transaction)),
    })),
    storage: new SequelizeStorage({ sequelize, tableName: 'migrations' }),
    logger: undefined,
  });
  const done = await umzug.up();
  return done.map(({ name }) => name);
}
