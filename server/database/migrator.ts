import { QueryTypes, type Sequelize } from 'sequelize';
import { Umzug, type UmzugStorage } from 'umzug';
import { migrations } from './migrations/index.ts';

const table = 'schema_migrations';

function storage(pool: Sequelize): UmzugStorage {
  return {
    async logMigration({ name }) {
      await pool.query(`INSERT INTO ${table} (name) VALUES (?)`, { replacements: [name] });
    },
    async unlogMigration({ name }) {
      await pool.query(`DELETE FROM ${table} WHERE name = ?`, { replacements: [name] });
    },
    executed: () => appliedMigrations(pool),
  };
}

async function run(pool: Sequelize, statements: readonly string[]): Promise<void> {
  for (const statement of statements) await pool.query(statement);
}

/** Moves the tables up and down; the pool's account must be the owner of the database. */
export function createMigrator(pool: Sequelize) {
  return new Umzug({
    migrations: migrations.map(({ name, up, down }) => ({
      name,
      up: () => run(pool, up),
      down: () => run(pool, down),
    })),
    storage: storage(pool),
    logger: undefined,
  });
}

/** Makes the list of applied migrations; needs the owner's account. */
export async function prepareMigrationTable(pool: Sequelize): Promise<void> {
  await pool.query(
    `CREATE TABLE IF NOT EXISTS ${table} (name VARCHAR(100) NOT NULL PRIMARY KEY, applied_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)) ENGINE=InnoDB`,
  );
}

/** Names of the applied migrations, oldest first. */
export async function appliedMigrations(pool: Sequelize): Promise<string[]> {
  const rows = await pool.query<{ name: string }>(`SELECT name FROM ${table} ORDER BY name`, {
    type: QueryTypes.SELECT,
  });
  return rows.map(({ name }) => name);
}

/** What keeps the tables from fitting this program: migrations not applied, and ones it does not know. */
export async function migrationState(pool: Sequelize): Promise<{ missing: string[]; unknown: string[] }> {
  const applied = new Set(await appliedMigrations(pool));
  const known = new Set(migrations.map(({ name }) => name));
  return {
    missing: [...known].filter((name) => !applied.has(name)),
    unknown: [...applied].filter((name) => !known.has(name)),
  };
}
