import { QueryTypes, type Sequelize } from 'sequelize';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { migrateDatabase } from '@server/database/migrate.ts';
import { createMigrator, migrationState, prepareMigrationTable } from '@server/database/migrator.ts';
import { migrations } from '@server/database/migrations/index.ts';
import { createPool } from '@server/database/sequelize.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';

let database: TestDatabase;
let pool: Sequelize;

beforeAll(async () => {
  database = await createTestDatabase();
  pool = createPool(database.ownerUrl, 1);
  await prepareMigrationTable(pool);
});
afterAll(async () => {
  await pool.close();
  await database.drop();
});

const shape = async () => {
  const of = (sql: string) => pool.query(sql, { type: QueryTypes.SELECT });
  return [
    await of(
      'SELECT TABLE_NAME, COLUMN_NAME, COLUMN_TYPE, IS_NULLABLE, COLLATION_NAME FROM information_schema.COLUMNS WHERE TABLE_SCHEMA = DATABASE() ORDER BY 1, 2',
    ),
    await of(
      'SELECT TABLE_NAME, CONSTRAINT_NAME, CHECK_CLAUSE FROM information_schema.CHECK_CONSTRAINTS WHERE CONSTRAINT_SCHEMA = DATABASE() ORDER BY 1, 2',
    ),
    await of(
      'SELECT TRIGGER_NAME, EVENT_MANIPULATION, ACTION_STATEMENT FROM information_schema.TRIGGERS WHERE TRIGGER_SCHEMA = DATABASE() ORDER BY 1',
    ),
  ];
};

test('each step goes up, down and up again to the same tables', async () => {
  const migrator = createMigrator(pool);
  for (const { name } of migrations) {
    const before = await shape();
    await migrator.up({ migrations: [name] });
    const up = await shape();
    expect(up, name).not.toEqual(before);
    await migrator.down({ migrations: [name] });
    expect(await shape(), name).toEqual(before);
    await migrator.up({ migrations: [name] });
    expect(await shape(), name).toEqual(up);
  }
  expect(await migrationState(pool)).toEqual({ missing: [], unknown: [] });
});

test('two processes that start at once apply each step once', async () => {
  const other = await createTestDatabase();
  const applied = await Promise.all([migrateDatabase(other.ownerUrl), migrateDatabase(other.ownerUrl)]);
  expect(applied.map((names) => names.length).sort((a, b) => a - b)).toEqual([0, migrations.length]);
  await other.drop();
});

test('tables made by a newer program are left alone', async () => {
  await pool.query("INSERT INTO schema_migrations (name) VALUES ('999-of-tomorrow')");
  await expect(migrateDatabase(database.ownerUrl)).rejects.toThrow(
    'made by a newer Backmark (it has 999-of-tomorrow)',
  );
  await pool.query("DELETE FROM schema_migrations WHERE name = '999-of-tomorrow'");
});

test('the account of the program may not migrate', async () => {
  await expect(migrateDatabase(database.appUrl)).rejects.toThrow();
});

test('an absent database is waited for, and then told', async () => {
  const began = Date.now();
  await expect(migrateDatabase('mariadb://a:b@127.0.0.1:1/none', { patience: 1_500 })).rejects.toThrow();
  expect(Date.now() - began).toBeGreaterThan(700);
});
