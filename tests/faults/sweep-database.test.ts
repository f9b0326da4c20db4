import { randomBytes } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { verifyAudit } from '@server/features/audit/verification-service.ts';
import { databaseStatements, databaseUrl } from '../../server/dev/mariadb-accounts.mjs';
import { startMariaDB, type RunningServer } from '../../server/dev/mariadb.mjs';
import { endPrograms, startProgram, type Program } from './support/program.ts';
import { createWorld, type World } from './support/world.ts';

const minutes = 60_000;
const folder = mkdtempSync(join(tmpdir(), 'backmark-fault-'));
const owner = { user: 'owner', password: randomBytes(16).toString('hex') };
const application = { user: 'app', password: randomBytes(16).toString('hex') };
const statements = databaseStatements('faults', owner, application);

let server: RunningServer;
let world: World;
let program: Program;

const start = (port: number, keepPort: boolean) =>
  startMariaDB({ folder, port, keepPort, statements, account: owner });
const statusOf = (path: string) => fetch(`${program.url}${path}`).then(({ status }) => status);

beforeAll(async () => {
  server = await start(0, false);
  const url = (account: typeof owner) => databaseUrl(account, server.port, 'faults');
  world = await createWorld({ ownerUrl: url(owner), appUrl: url(application) });
  program = await startProgram(url(application));
}, 2 * minutes);
afterAll(async () => {
  await endPrograms();
  await world.close();
  await server.stop();
  rmSync(folder, { recursive: true, force: true });
});

test(
  'the database is killed in the middle of a sweep: the sweep waits and goes on',
  { timeout: 6 * minutes },
  async () => {
    const first = await world.ask('GP-01');
    await world.until(first.jobId, ({ state }) => state === 'done', 120);
    const undisturbed = await world.outcome(first.revisionId, first.jobId);

    const { revisionId, jobId } = await world.ask('GP-02');
    for (const after of [2, 8]) {
      const job = await world.until(jobId, ({ chunksDone }) => chunksDone >= after, 90);
      await server.kill();
      expect(job.state, 'the sweep was over before the kill').toBe('running');
      expect(await statusOf('/api/health')).toBe(200);
      expect(await statusOf('/api/ready')).toBe(503);
      server = await start(server.port, true);
      await expect.poll(() => statusOf('/api/ready'), { timeout: 10_000, interval: 50 }).toBe(200);
      const kept = await world.job(jobId);
      expect(kept.chunksDone, 'what was stored is there').toBeGreaterThanOrEqual(job.chunksDone);
      expect(kept.chunksDone, 'the kill was in the middle').toBeLessThan(kept.chunkCount);
    }
    await world.until(jobId, ({ state }) => state === 'done', 120);
    expect(await world.outcome(revisionId, jobId)).toEqual(undisturbed);
    expect(await verifyAudit(world.app.db)).toMatchObject({ valid: true, faults: [] });
    expect(program.output()).not.toContain('unhandled rejection');
  },
);
