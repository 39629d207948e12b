import { Sequelize } from 'sequelize-typescript';
import { Transaction } from 'sequelize';

/**
 * Owner of the one writer. SQLite takes one write at a time; waiting writers would fill the driver's
 * threads and starve the one that could commit, so they wait here instead.
 */
export class DatabaseService {
  private last: Promise<unknown> = Promise.resolve();

  constructor(readonly sequelize: Sequelize) {}

  /**
   * Runs a job in an IMMEDIATE transaction, one at a time.
   *
   * @returns what the job returns; its error rolls everything back.
   */
  write<T>(job: (transaction: Transaction) => Promise<T>): Promise<T> {
    const run = () =>
      this.sequelize.transaction({ type: Transaction.TYPES.IMMEDIATE }, (transaction) =>
        job(transaction),
      );
    const result = this.last.then(run, run);
    this.last = result.catch(() => undefined);
    return result;
  }
}
