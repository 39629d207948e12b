import sqlite3 from 'sqlite3';

/** Pragmas of every connection. Sequelize has no hook that fires for each of SQLite's connections. */
const PRAGMAS = [
  'PRAGMA busy_timeout = 5000',
  'PRAGMA journal_mode = WAL',
  'PRAGMA foreign_keys = ON',
  'PRAGMA synchronous = NORMAL',
];

/** A database connection that sets itself up before anything else runs on it. */
class TunedDatabase extends sqlite3.Database {
  constructor(...args: ConstructorParameters<typeof sqlite3.Database>) {
    super(...args);
    this.serialize(() => PRAGMAS.forEach((pragma) => this.run(pragma)));
  }
}

/** The driver as Sequelize wants it, with tuned connections. */
export const tunedSqlite = { ...sqlite3, Database: TunedDatabase };
