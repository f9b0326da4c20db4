import { randomBytes } from 'node:crypto';
import { createConnection } from 'mariadb';
import { inject } from 'vitest';
import { databaseStatements, databaseUrl, dropStatements } from '../../server/dev/mariadb-accounts.mjs';

/** A database of one test file, with the same two accounts and rights as the program's own. */
export interface TestDatabase {
  name: string;
  /** For migrations: may change tables and triggers. */
  ownerUrl: string;
  /** For the program: SELECT, INSERT, UPDATE, DELETE only. */
  appUrl: string;
  drop(): Promise<void>;
}

async function runStatements(statements: string[]): Promise<void> {
  const url = new URL(inject('databaseAdministratorUrl'));
  const connection = await createConnection({
    host: url.hostname,
    port: Number(url.port),
    user: url.username,
    password: url.password,
  });
  try {
    for (const statement of statements) await connection.query(statement);
  } finally {
    await connection.end();
  }
}

/** Makes an empty database with accounts of its own; call `drop` when the test file is done. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const suffix = randomBytes(6).toString('hex');
  const name = `test${suffix}`;
  const account = (role: string) => ({
    user: `${role}_${suffix}`,
    password: randomBytes(16).toString('hex'),
  });
  const owner = account('owner');
  const application = account('app');
  await runStatements(databaseStatements(name, owner, application));
  const port = Number(new URL(inject('databaseAdministratorUrl')).port);
  return {
    name,
    ownerUrl: databaseUrl(owner, port, name),
    appUrl: databaseUrl(application, port, name),
    drop: () => runStatements(dropStatements(name, owner, application)),
  };
}
