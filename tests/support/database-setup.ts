import { randomBytes } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { administratorStatements } from '../../server/dev/mariadb-accounts.mjs';
import { startMariaDB } from '../../server/dev/mariadb.mjs';

declare module 'vitest' {
  interface ProvidedContext {
    /** The account with which a test file makes its own database; see database.ts. */
    databaseAdministratorUrl: string;
  }
}

/** Starts one MariaDB server in a temporary folder for the whole project and takes it away afterwards. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const folder = mkdtempSync(join(tmpdir(), 'backmark-test-'));
  const administrator = { user: 'test_administrator', password: randomBytes(24).toString('hex') };
  const statements = administratorStatements(administrator);
  const server = await startMariaDB({ folder, port: 0, statements, account: administrator });
  project.provide('databaseAdministratorUrl', server.url(administrator));
  return async () => {
    await server.stop();
    rmSync(folder, { recursive: true, force: true });
  };
}
