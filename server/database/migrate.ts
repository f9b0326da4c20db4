import { setTimeout as delay } from 'node:timers/promises';
import { QueryTypes, type Sequelize } from 'sequelize';
import { createMigrator, migrationState, prepareMigrationTable } from './migrator.ts';
import { createPool } from './sequelize.ts';

const lock = 'backmark-migrations';

/** Waits until the database answers, longer each time; the last error when it never does. */
async function waitForDatabase(pool: Sequelize, patience: number): Promise<void> {
  const end = Date.now() + patience;
  for (let wait = 250; ; wait = Math.min(wait * 2, 5_000)) {
    try {
      await pool.query('SELECT 1', { type: QueryTypes.SELECT });
      return;
    } catch (error) {
      if (Date.now() + wait > end) throw error;
      await delay(wait);
    }
  }
}

async function applyAll(pool: Sequelize): Promise<string[]> {
  await prepareMigrationTable(pool);
  const { unknown } = await migrationState(pool);
  if (unknown.length > 0) {
    throw new Error(
      `The database was made by a newer Backmark (it has ${unknown.join(', ')}); use that version or restore an older backup.`,
    );
  }
  const applied = await createMigrator(pool).up();
  return applied.map(({ name }) => name);
}

/**
 * Applies every migration that is missing; one process at a time does so, others wait for it.
 * @param url of the account that owns the tables
 * @returns the names of those applied now
 */
export async function migrateDatabase(url: string, { patience = 30_000 } = {}): Promise<string[]> {
  const pool = createPool(url, 1);
  try {
    await waitForDatabase(pool, patience);
    const [got] = await pool.query<{ got: number }>(`SELECT GET_LOCK('${lock}', 60) AS got`, {
      type: QueryTypes.SELECT,
    });
    if (got?.got !== 1) throw new Error('Another process has been changing the tables for over a minute.');
    return await applyAll(pool);
  } finally {
    await pool.close();
  }
}
