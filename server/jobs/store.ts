import { createHash } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { Database } from '../database/sequelize.ts';
import type { ChunkPlan } from './chunks.ts';
import { HELD, parts, type Lease } from './queue.ts';
import type { PackedVariant } from './sweep-worker.ts';

/** The lease went to another runner: whatever was computed is dropped. */
export class LeaseLost extends Error {}

/**
 * Stores a chunk and its "done" mark in one transaction under the fence. Stored twice is stored once.
 * @throws {LeaseLost} when another runner has the job
 */
export async function storeChunk(
  db: Database,
  lease: Lease,
  chunk: ChunkPlan,
  variants: readonly PackedVariant[],
): Promise<void> {
  await db.transaction(async (transaction) => {
    const [job] = await db.select<{ id: number }>(
      `SELECT id FROM jobs WHERE ${HELD} FOR UPDATE`,
      parts(lease),
      transaction,
    );
    if (!job) throw new LeaseLost();
    const place = { jobId: lease.jobId, number: chunk.number };
    const row = await db.models.JobChunk.findOne({
      where: place,
      transaction,
      lock: transaction.LOCK.UPDATE,
    });
    if (!row || row.state === 'done') return;
    await insertVariants(db, lease.revisionId, variants, transaction);
    await row.update({ state: 'done', resultHash: hashOf(variants) }, { transaction });
    await db.execute(
      'UPDATE jobs SET chunks_done = chunks_done + 1 WHERE id = :jobId',
      parts(lease),
      transaction,
    );
  });
}

async function insertVariants(
  db: Database,
  revisionId: number,
  variants: readonly PackedVariant[],
  transaction: Transaction,
): Promise<void> {
  const rows = variants.map(({ capacities, governing, ...facts }) => ({
    revisionId,
    ...facts,
    capacities: Buffer.from(capacities),
    governing: Buffer.from(governing),
  }));
  await db.models.Variant.bulkCreate(rows, { transaction, validate: false });
}

function hashOf(variants: readonly PackedVariant[]): string {
  const hash = createHash('sha256');
  for (const { paramsHash, capacities, governing } of variants) {
    hash.update(paramsHash).update(capacities).update(governing);
  }
  return hash.digest('hex');
}
