import type { Transaction } from 'sequelize';
import type { Database } from '../database/sequelize.ts';
import { planChunks } from './chunks.ts';

/** What a sweep is of; frozen when it is asked for. */
export interface SweepSpec {
  readonly definitionHash: string;
  readonly variantCount: number;
  readonly cellCount: number;
}

/** A job in the hands of one runner: every write names the lease. */
export interface Lease {
  readonly jobId: number;
  readonly revisionId: number;
  readonly owner: string;
  readonly fence: number;
  readonly spec: SweepSpec;
}

/** Seconds a job stays leased without a heartbeat. */
export const LEASE_SECONDS = 15;
/** Times a job is taken up before it is given up: a computation that kills its process must not go round for ever. */
const MOST_CLAIMS = 50;

/** The condition that a write is still this lease's. */
export const HELD = "id = :jobId AND lease_owner = :owner AND fence = :fence AND state = 'running'";

/** Puts a sweep into the queue. A second live one of the same revision breaks a unique key. */
export async function enqueueSweep(
  db: Database,
  request: { revisionId: number; requestedBy: number; spec: SweepSpec },
  transaction: Transaction,
): Promise<number> {
  const { revisionId, requestedBy, spec } = request;
  const chunks = planChunks(spec.variantCount, spec.cellCount);
  const chunkCount = chunks.length;
  const fields = { revisionId, requestedBy, spec, specHash: spec.definitionHash, chunkCount };
  const job = await db.models.Job.create(fields, { transaction });
  const rows = chunks.map((chunk) => ({ jobId: job.id, ...chunk }));
  await db.models.JobChunk.bulkCreate(rows, { transaction });
  return job.id;
}

/** Takes the next job: the oldest that waits, or one whose runner has fallen silent. Null when there is none. */
export function claimJob(db: Database, owner: string): Promise<Lease | null> {
  return db.transaction(async (transaction) => {
    const [next] = await db.select<{ id: number; attempts: number }>(
      `SELECT id, attempts FROM jobs
       WHERE (state = 'queued' AND (run_after IS NULL OR run_after <= NOW(3)))
          OR (state = 'running' AND lease_until < NOW(3))
       ORDER BY priority DESC, id LIMIT 1 FOR UPDATE SKIP LOCKED`,
      undefined,
      transaction,
    );
    if (!next) return null;
    if (next.attempts >= MOST_CLAIMS) {
      await db.execute(
        `UPDATE jobs SET state = 'failed', finished_at = NOW(3), error = :error WHERE id = :id`,
        { id: next.id, error: `Taken up ${MOST_CLAIMS} times without an end.` },
        transaction,
      );
      return null;
    }
    await db.execute(
      `UPDATE jobs SET state = 'running', lease_owner = :owner, fence = fence + 1, attempts = attempts + 1,
         lease_until = NOW(3) + INTERVAL ${LEASE_SECONDS} SECOND, started_at = COALESCE(started_at, NOW(3))
       WHERE id = :id`,
      { id: next.id, owner },
      transaction,
    );
    const job = await db.models.Job.findByPk(next.id, { transaction });
    if (!job) return null;
    const { id: jobId, revisionId, fence } = job;
    return { jobId, revisionId, owner, fence: Number(fence), spec: job.spec as SweepSpec };
  });
}

/** Keeps the lease; false when it was lost, or when a cancel was asked for. */
export async function keepLease(db: Database, lease: Lease): Promise<'held' | 'lost' | 'cancelled'> {
  const touched = await db.execute(
    `UPDATE jobs SET lease_until = NOW(3) + INTERVAL ${LEASE_SECONDS} SECOND WHERE ${HELD}`,
    parts(lease),
  );
  if (touched > 0) return (await cancelAsked(db, lease)) ? 'cancelled' : 'held';
  // Two beats within a millisecond change nothing, which is not the same as a lost lease.
  const [row] = await db.select<{ id: number }>(`SELECT id FROM jobs WHERE ${HELD}`, parts(lease));
  return row ? 'held' : 'lost';
}

async function cancelAsked(db: Database, lease: Lease): Promise<boolean> {
  const [row] = await db.select<{ asked: number }>(
    'SELECT cancel_requested AS asked FROM jobs WHERE id = :jobId',
    parts(lease),
  );
  return Boolean(row?.asked);
}

/** Lets another runner go on at once. */
export async function releaseLease(db: Database, lease: Lease): Promise<void> {
  await db.execute(`UPDATE jobs SET lease_until = NOW(3) - INTERVAL 1 SECOND WHERE ${HELD}`, parts(lease));
}

/** Ends a job that was cancelled or cannot be done; its cells go. */
export async function endJob(
  db: Database,
  lease: Lease,
  state: 'failed' | 'cancelled',
  error: string | null,
): Promise<void> {
  await db.transaction(async (transaction) => {
    const touched = await db.execute(
      `UPDATE jobs SET state = :state, error = :error, finished_at = NOW(3), lease_until = NULL WHERE ${HELD}`,
      { ...parts(lease), state, error: error?.slice(0, 2000) ?? null },
      transaction,
    );
    if (touched === 0) return;
    const sql = 'DELETE FROM variants WHERE revision_id = :revisionId';
    await db.execute(sql, { revisionId: lease.revisionId }, transaction);
  });
}

export const parts = ({ jobId, owner, fence }: Lease) => ({ jobId, owner, fence });
