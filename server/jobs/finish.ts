import { ENGINE_VERSION } from '@shared/engine/index.ts';
import { RULE_CODE, ruleLegend, type SweepGrid } from '@shared/engine/sweep/index.ts';
import type { App } from '../context.ts';
import type { ResultSummary } from '../database/models/revision.ts';
import { appendAudit } from '../features/audit/service.ts';
import { layOut, type CheckedDefinition } from '../features/families/definition-service.ts';
import { HELD, parts, type Lease } from './queue.ts';
import { LeaseLost } from './store.ts';

/** Variants looked through at once. */
const BATCH = 2000;

/** Makes a revision whose every chunk is stored swept: counts, summary and state in one transaction. */
export async function finishSweep(app: App, lease: Lease): Promise<void> {
  const { Revision } = app.db.models;
  const draft = await Revision.findByPk(lease.revisionId);
  if (!draft || draft.definitionHash !== lease.spec.definitionHash) throw new LeaseLost();
  const checked = layOut(draft.definition);
  const summary = await summarise(app, lease.revisionId, checked);
  await app.db.transaction(async (transaction) => {
    const touched = await app.db.execute(
      `UPDATE jobs SET state = 'done', finished_at = NOW(3), lease_until = NULL WHERE ${HELD} AND chunks_done = chunk_count`,
      parts(lease),
      transaction,
    );
    if (touched === 0) throw new LeaseLost();
    const lock = { transaction, lock: transaction.LOCK.UPDATE };
    const row = await Revision.findByPk(lease.revisionId, lock);
    if (row?.state !== 'draft' || row.definitionHash !== lease.spec.definitionHash) throw new LeaseLost();
    const { variantCount, cellCount } = checked.grid;
    const rejectedCells = summary.rejected.reduce((sum, { cells }) => sum + cells, 0);
    const counts = { variantCount, cellCount, rejectedCells };
    const result = {
      state: 'swept',
      engineVersion: ENGINE_VERSION,
      resultSummary: summary,
      ...counts,
    } as const;
    await row.update(result, { transaction });
    const subject = { subjectType: 'revision', subjectId: row.id };
    const detail = { engineVersion: ENGINE_VERSION, ...counts };
    await appendAudit(
      transaction,
      { actorId: null, action: 'revision.swept', ...subject, detail },
      app.clock.now(),
    );
  });
}

async function summarise(
  app: App,
  revisionId: number,
  { definition, kind, grid }: CheckedDefinition,
): Promise<ResultSummary> {
  const tally = { lowest: Infinity, highest: -Infinity, rejected: new Uint32Array(256) };
  for (let from = 0; from < grid.variantCount; from += BATCH) await countCells(app, revisionId, from, tally);
  const legend = ruleLegend(kind, definition.rules);
  const some = tally.lowest !== Infinity;
  return {
    ...layout(grid),
    increment: definition.increment,
    lowest: some ? tally.lowest : null,
    highest: some ? tally.highest : null,
    rejected: legend.flatMap(({ id }, index) => {
      const cells = tally.rejected[RULE_CODE - index]!;
      return cells > 0 ? [{ rule: id, cells }] : [];
    }),
  };
}

const layout = ({ axes, angles, senses }: SweepGrid) => ({ axes, angles, senses });

async function countCells(
  app: App,
  revisionId: number,
  from: number,
  tally: { lowest: number; highest: number; rejected: Uint32Array },
): Promise<void> {
  const rows = await app.db.select<{ capacities: Buffer; governing: Buffer }>(
    'SELECT capacities, governing FROM variants WHERE revision_id = :revisionId AND ordinal >= :from AND ordinal < :to',
    { revisionId, from, to: from + BATCH },
  );
  for (const { capacities, governing } of rows) {
    for (let cell = 0; cell < governing.length; cell++) {
      const capacity = capacities.readFloatLE(cell * 4);
      if (Number.isNaN(capacity)) tally.rejected[governing[cell]!]!++;
      else {
        tally.lowest = Math.min(tally.lowest, capacity);
        tally.highest = Math.max(tally.highest, capacity);
      }
    }
  }
}
