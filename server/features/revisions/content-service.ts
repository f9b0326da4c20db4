import { createHash } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { canonicalJson } from '../../canonical-json.ts';
import type { App } from '../../context.ts';
import type { RevisionRow } from '../../database/models/revision.ts';

interface StoredVariant {
  ordinal: number;
  params_hash: string;
  mass: number;
  bolt_count: number;
  weld_volume: number;
  capacities: Buffer;
  governing: Buffer;
}

/** Variants read at once. */
const BATCH = 2000;

/**
 * SHA-256 over a revision's definition, engine version and every cell, in the order of the grid. What it is taken
 * over: one line of canonical JSON for the head, then for each variant a line of canonical JSON and the packed bytes.
 */
export async function contentHashOf(app: App, row: RevisionRow, transaction?: Transaction): Promise<string> {
  const hash = createHash('sha256');
  const head = {
    definition: row.definitionHash,
    engine: row.engineVersion,
    variants: row.variantCount,
    cells: row.cellCount,
    rejected: row.rejectedCells,
  };
  hash.update(`${canonicalJson(head)}\n`);
  for (let from = 0; ; from += BATCH) {
    const variants = await app.db.select<StoredVariant>(
      `SELECT ordinal, params_hash, mass, bolt_count, weld_volume, capacities, governing FROM variants
       WHERE revision_id = :id AND ordinal >= :from AND ordinal < :to ORDER BY ordinal`,
      { id: row.id, from, to: from + BATCH },
      transaction ?? null,
    );
    for (const { capacities, governing, ...facts } of variants) {
      hash
        .update(`${canonicalJson(facts)}\n`)
        .update(capacities)
        .update(governing);
    }
    if (from + BATCH >= (row.variantCount ?? 0)) break;
  }
  return hash.digest('hex');
}

/** Whether a published revision still is what was published. */
export async function verifyContent(app: App, row: RevisionRow): Promise<boolean> {
  return row.contentHash !== null && (await contentHashOf(app, row)) === row.contentHash;
}
