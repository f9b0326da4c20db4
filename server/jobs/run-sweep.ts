import type { App } from '../context.ts';
import type { JobChunkRow } from '../database/models/job-chunk.ts';
import { finishSweep } from './finish.ts';
import type { SweepPool } from './pool.ts';
import { endJob, keepLease, releaseLease, type Lease } from './queue.ts';
import { LeaseLost, storeChunk } from './store.ts';

/** Milliseconds between heartbeats: three fit into a lease. */
const HEARTBEAT = 4000;
/** Times one chunk may fail before the sweep does. */
const MOST_ATTEMPTS = 3;

/** A chunk cannot be computed: the sweep fails with its reason. */
class ChunkFailed extends Error {}
class Cancelled extends Error {}

/**
 * Works a leased sweep to its end, or until it is cancelled, lost to another runner or the program stops. A fault
 * of the database is thrown: the lease then runs out and the sweep is taken up again where it was.
 */
export async function runSweep(
  app: App,
  pool: SweepPool,
  lease: Lease,
  stopping: AbortSignal,
): Promise<void> {
  const work = new AbortController();
  const stop = () => work.abort();
  stopping.addEventListener('abort', stop);
  const beat = setInterval(() => void heartbeat(app, lease, work), HEARTBEAT);
  try {
    await computeChunks(app, pool, lease, work);
    await finishSweep(app, lease);
  } catch (error) {
    await settle(app, lease, error, stopping, work.signal);
  } finally {
    clearInterval(beat);
    stopping.removeEventListener('abort', stop);
    app.hub.publish('sweeps', lease.jobId);
  }
}

async function heartbeat(app: App, lease: Lease, work: AbortController): Promise<void> {
  try {
    const state = await keepLease(app.db, lease);
    if (state === 'lost') work.abort(new LeaseLost());
    if (state === 'cancelled') work.abort(new Cancelled());
  } catch (error) {
    app.log.warn({ err: error, job: lease.jobId }, 'a heartbeat did not reach the database');
  }
}

async function settle(
  app: App,
  lease: Lease,
  error: unknown,
  stopping: AbortSignal,
  work: AbortSignal,
): Promise<void> {
  const cause: unknown = work.aborted ? work.reason : error;
  if (stopping.aborted) return releaseLease(app.db, lease);
  if (cause instanceof Cancelled) return endJob(app.db, lease, 'cancelled', null);
  if (cause instanceof ChunkFailed) return endJob(app.db, lease, 'failed', cause.message);
  if (cause instanceof LeaseLost) {
    app.log.warn({ job: lease.jobId, fence: lease.fence }, 'the sweep went to another runner');
    return;
  }
  throw cause;
}

/** As many chunks at once as there are threads; each is stored as soon as it is computed. */
async function computeChunks(app: App, pool: SweepPool, lease: Lease, work: AbortController): Promise<void> {
  const revision = await app.db.models.Revision.findByPk(lease.revisionId);
  if (!revision || revision.definitionHash !== lease.spec.definitionHash) throw new LeaseLost();
  const { jobId } = lease;
  const where = { jobId, state: 'waiting' };
  const waiting = await app.db.models.JobChunk.findAll({ where, order: [['number', 'ASC']] });
  const next = waiting.values();
  const lane = async () => {
    for (const chunk of next) {
      work.signal.throwIfAborted();
      await computeChunk(app, pool, lease, chunk, revision.definition, work.signal);
    }
  };
  // The first fault ends the other lanes too; all are waited for, so that none writes after the sweep is settled.
  const lanes = Array.from({ length: pool.threads }, () => lane().catch((error) => work.abort(error)));
  await Promise.all(lanes);
  work.signal.throwIfAborted();
}

async function computeChunk(
  app: App,
  pool: SweepPool,
  lease: Lease,
  chunk: JobChunkRow,
  definition: string,
  signal: AbortSignal,
): Promise<void> {
  const { number, firstOrdinal, variantCount } = chunk;
  const plan = { number, firstOrdinal, variantCount };
  for (;;) {
    try {
      const variants = await pool.run({ ...plan, definition }, signal);
      await storeChunk(app.db, lease, plan, variants);
      if ((await keepLease(app.db, lease)) === 'cancelled') throw new Cancelled();
      return;
    } catch (error) {
      if (signal.aborted || !isComputation(error)) throw error;
      await chunk.update({ attempts: chunk.attempts + 1 });
      if (chunk.attempts >= MOST_ATTEMPTS)
        throw new ChunkFailed(reasonOf(error, plan.firstOrdinal), { cause: error });
    }
  }
}

/** Whether the fault is the computation's own, which trying again elsewhere would not mend. */
function isComputation(error: unknown): boolean {
  if (!(error instanceof Error) || error instanceof LeaseLost || error instanceof Cancelled) return false;
  return !error.name.startsWith('Sequelize');
}

const reasonOf = (error: unknown, ordinal: number): string =>
  `Variants from number ${ordinal + 1} on could not be computed: ${(error as Error).message}`;
