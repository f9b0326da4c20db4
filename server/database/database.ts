import { QueryTypes, Transaction, type Sequelize } from 'sequelize';
import type { Models } from './models/index.ts';
import { withRetries } from './retry.ts';

export type Replacements = Record<string, unknown> | unknown[];

/** The one way to the data: models for whole records, and SQL with replacements where models are too slow. */
export interface Database {
  readonly sequelize: Sequelize;
  readonly models: Models;
  /** Rows of a SELECT or SHOW. */
  select<Row extends object>(
    sql: string,
    replacements?: Replacements,
    transaction?: Transaction | null,
  ): Promise<Row[]>;
  /** Runs a change; the number of rows it touched. */
  execute(sql: string, replacements?: Replacements, transaction?: Transaction | null): Promise<number>;
  /** Runs an INSERT; the id it was given. */
  insert(sql: string, replacements?: Replacements, transaction?: Transaction | null): Promise<number>;
  /**
   * One READ COMMITTED transaction. A lost race (1020, 1205, 1213) is rolled back and tried anew, so `work`
   * must do nothing outside the database.
   * @param options.retries how often it is tried again; 5 unless said
   */
  transaction<T>(work: (transaction: Transaction) => Promise<T>, options?: { retries?: number }): Promise<T>;
  close(): Promise<void>;
}

/** Wraps a connection pool and its models. */
export function databaseOn(sequelize: Sequelize, models: Models): Database {
  const isolationLevel = Transaction.ISOLATION_LEVELS.READ_COMMITTED;
  const options = (replacements?: Replacements, transaction?: Transaction | null) => ({
    ...(replacements ? { replacements } : {}),
    transaction: transaction ?? null,
  });
  return {
    sequelize,
    models,
    select: <Row extends object>(
      sql: string,
      replacements?: Replacements,
      transaction?: Transaction | null,
    ) => sequelize.query<Row>(sql, { ...options(replacements, transaction), type: QueryTypes.SELECT }),
    execute: (sql, replacements, transaction) =>
      sequelize.query(sql, { ...options(replacements, transaction), type: QueryTypes.BULKUPDATE }),
    async insert(sql, replacements, transaction) {
      const [id] = await sequelize.query(sql, {
        ...options(replacements, transaction),
        type: QueryTypes.INSERT,
      });
      return id;
    },
    transaction: (work, { retries = 5 } = {}) =>
      withRetries(() => sequelize.transaction({ isolationLevel }, work), retries),
    close: () => sequelize.close(),
  };
}
