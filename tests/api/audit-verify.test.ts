import { execFile } from 'node:child_process';
import { createConnection } from 'mariadb';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { createHarness, type Harness } from './harness.ts';

const root = new URL('../..', import.meta.url).pathname;
let harness: Harness;

beforeAll(async () => {
  harness = await createHarness();
  for (const role of ['engineer', 'drafter'] as const) await harness.signedIn(role);
});
afterAll(() => harness.close());

/** The command as a person runs it, with what it printed and its exit status. */
function run(...anchor: string[]): Promise<{ status: number; printed: string }> {
  const args = ['--import', 'tsx', 'server/cli/audit-verify.ts', ...anchor];
  const env = { PATH: process.env.PATH ?? '', DATABASE_URL: harness.appUrl };
  return new Promise((resolve) => {
    const child = execFile(process.execPath, args, { cwd: root, env }, (_error, stdout, stderr) =>
      resolve({ status: child.exitCode ?? -1, printed: stdout + stderr }),
    );
  });
}

test('a sound trail is said to be sound, with a head to keep', async () => {
  const { status, printed } = await run();
  expect(status).toBe(0);
  expect(printed).toMatch(/^Sound: 2 entries\.\nHead 2:[0-9a-f]{64}\n$/);
  const head = /Head (\S+)/.exec(printed)?.[1] ?? '';
  expect((await run(head)).status).toBe(0);
  const other = await run(`2:${'a'.repeat(64)}`);
  expect(other).toMatchObject({
    status: 1,
    printed: expect.stringContaining('whose hash was kept') as string,
  });
});

test('an anchor that is none is not taken', async () => {
  const { status, printed } = await run('2:xyz');
  expect(status).toBe(2);
  expect(printed).toContain('"2:xyz" is not an entry\'s number and hash');
});

test('a faulty trail is told entry by entry', async () => {
  const owner = await createConnection(harness.ownerUrl);
  await owner.query('DROP TRIGGER audit_no_update');
  await owner.query("UPDATE audit SET action = 'person.created' WHERE seq = 1");
  await owner.end();
  const { status, printed } = await run();
  expect(status).toBe(1);
  expect(printed).toContain('Entry 1: its content was altered after it was written.\nNot sound: 2 entries.');
});
