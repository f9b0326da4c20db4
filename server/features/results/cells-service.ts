import type { ResultBlock } from '@shared/contracts/revisions.ts';
import type { App } from '../../context.ts';
import { cellsOf, readBlock } from './stored-cells.ts';
import type { SweptRevision } from './swept-revision.ts';

/** Cells in one answer; a block that would hold more is cut short, and says so by its count. */
const MOST_CELLS = 1_000_000;

/** A block of whole variants as flat columns. */
export async function viewCells(
  app: App,
  { row, angles, senses, variants, summary }: SweptRevision,
  { from, count }: { from: number; count: number },
): Promise<ResultBlock> {
  const each = angles.length * senses.length;
  const most = Math.max(1, Math.floor(MOST_CELLS / each));
  const rows = await readBlock(app, row.id, from, Math.max(0, Math.min(count, most, variants - from)));
  const cells = rows.map((variant) => cellsOf(variant, 0, each, summary.increment));
  return {
    from,
    count: rows.length,
    capacity: cells.flatMap(({ capacity }) => capacity),
    governing: cells.flatMap(({ governing }) => governing),
    mass: rows.map(({ mass }) => mass),
    boltCount: rows.map(({ bolt_count }) => bolt_count),
    weldVolume: rows.map(({ weld_volume }) => weld_volume),
  };
}
