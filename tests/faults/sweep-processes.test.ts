import { afterAll, afterEach, beforeAll, expect, test } from 'vitest';
import { verifyAudit } from '@server/features/audit/verification-service.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { endPrograms, startProgram } from './support/program.ts';
import { cellsOfIt, createWorld, type JobFacts, type Outcome, type World } from './support/world.ts';

/*
 * A sweep that is disturbed ends with the very cells of one that is not. SIGKILL ends the processes but not the
 * machine: what the operating system holds in its cache survives, so this says nothing about a loss of power.
 */

let database: TestDatabase;
let world: World;
let undisturbed: Outcome;

const minutes = 60_000;
const done = ({ state }: JobFacts) => state === 'done';
const pieces = (count: number) => (job: JobFacts) => job.chunksDone >= count;

/** A lease runs out after 15 s; a sweep that nothing stops takes a few more. */
const takenUpAndDone = 90;

beforeAll(async () => {
  database = await createTestDatabase();
  world = await createWorld(database);
  const program = await startProgram(database.appUrl);
  const { revisionId, jobId } = await world.ask('GP-01');
  await world.until(jobId, done, 120);
  undisturbed = await world.outcome(revisionId, jobId);
  program.signal('SIGTERM');
  expect(await program.exited).toBe(0);
}, 4 * minutes);
afterEach(endPrograms);
afterAll(async () => {
  await endPrograms();
  await world.close();
  await database.drop();
});

/** Every piece done once, every variant there once, and the trail of it all sound. */
async function expectWhole(revisionId: number, jobId: number): Promise<void> {
  const { chunkCount, chunksDone } = await world.job(jobId);
  expect(chunksDone).toBe(chunkCount);
  const outcome = await world.outcome(revisionId, jobId);
  expect(outcome).toEqual(undisturbed);
  const swept = await world.app.db.select<{ seq: number }>(
    "SELECT seq FROM audit WHERE action = 'revision.swept' AND subject_id = :revisionId",
    { revisionId },
  );
  expect(swept).toHaveLength(1);
  expect(await verifyAudit(world.app.db)).toMatchObject({ valid: true, faults: [] });
}

test('the undisturbed sweep is whole', async () => {
  const variants = cellsOfIt / 161;
  expect(undisturbed).toMatchObject({ state: 'swept', variants, distinct: variants });
  expect(undisturbed.pieces.length).toBeGreaterThan(12);
  expect(undisturbed.pieces.every(({ state, resultHash }) => state === 'done' && resultHash !== null)).toBe(
    true,
  );
});

test(
  'the program is killed twice in the middle of a sweep and started again',
  { timeout: 5 * minutes },
  async () => {
    const { revisionId, jobId } = await world.ask('GP-02');
    for (const after of [2, 7]) {
      const program = await startProgram(database.appUrl);
      const job = await world.until(jobId, pieces(after), takenUpAndDone);
      program.signal('SIGKILL');
      expect(await program.exited).toBeNull();
      expect(job.state, 'the sweep was over before the kill').toBe('running');
    }
    const left = await world.job(jobId);
    expect(left.chunksDone).toBeLessThan(left.chunkCount);
    await startProgram(database.appUrl);
    const job = await world.until(jobId, done, takenUpAndDone);
    expect(job.fence).toBe(3);
    await expectWhole(revisionId, jobId);
  },
);

test('a stop that is asked for hands the sweep on at once', { timeout: 3 * minutes }, async () => {
  const { revisionId, jobId } = await world.ask('GP-03');
  const first = await startProgram(database.appUrl);
  await world.until(jobId, pieces(2), takenUpAndDone);
  first.signal('SIGTERM');
  expect(await first.exited).toBe(0);
  const left = await world.job(jobId);
  expect(left).toMatchObject({ state: 'running' });
  expect(left.chunksDone).toBeLessThan(left.chunkCount);
  await startProgram(database.appUrl);
  await world.until(jobId, ({ fence }) => fence === 2, 5);
  await world.until(jobId, done, takenUpAndDone);
  await expectWhole(revisionId, jobId);
});

test(
  'a frozen program loses its sweep to another, and writes nothing when it thaws',
  { timeout: 4 * minutes },
  async () => {
    const { revisionId, jobId } = await world.ask('GP-04');
    const frozen = await startProgram(database.appUrl);
    const before = await world.until(jobId, pieces(2), takenUpAndDone);
    frozen.signal('SIGSTOP');
    await startProgram(database.appUrl);
    const taken = await world.until(jobId, ({ fence }) => fence === 2, 60);
    expect(taken.owner).not.toBe(before.owner);
    frozen.signal('SIGCONT');
    const after = await world.until(jobId, done, takenUpAndDone);
    expect(after.fence).toBe(2);
    await expectWhole(revisionId, jobId);
  },
);

test(
  'two programs share the queue, one is killed, and every sweep is whole',
  { timeout: 6 * minutes },
  async () => {
    const asked: { revisionId: number; jobId: number }[] = [];
    for (const code of ['GP-05', 'GP-06', 'GP-07']) asked.push(await world.ask(code));
    const [one] = await Promise.all([startProgram(database.appUrl), startProgram(database.appUrl)]);
    const running = async () => {
      const jobs = await Promise.all(asked.map(({ jobId }) => world.job(jobId)));
      return new Set(jobs.filter(({ state }) => state === 'running').map(({ owner }) => owner)).size;
    };
    await expect.poll(running, { timeout: 60_000, interval: 20 }).toBe(2);
    one.signal('SIGKILL');
    for (const { revisionId, jobId } of asked) {
      await world.until(jobId, done, 2 * takenUpAndDone);
      await expectWhole(revisionId, jobId);
    }
  },
);
