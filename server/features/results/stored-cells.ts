import { RULE_CODE, unpackCapacity } from '@shared/engine/sweep/index.ts';
import { floatsOf } from '../../documents/packed.ts';
import type { App } from '../../context.ts';

/** The packed cells of one variant; senses outside, angles inside. */
export interface StoredCells {
  readonly ordinal: number;
  readonly capacities: Buffer;
  readonly governing: Buffer;
}

export interface StoredVariant extends StoredCells {
  /** kg */
  readonly mass: number;
  readonly bolt_count: number;
  /** mm3 */
  readonly weld_volume: number;
}

/** Codes from here on are rules, counted back from RULE_CODE. */
const FIRST_RULE = 200;

/** A packed code as it crosses the wire: a limit state, or -1 - k for rule k of the legend. */
export const governingOf = (code: number): number => (code < FIRST_RULE ? code : code - RULE_CODE - 1);

/** Whole variants in ordinal order. */
export const readBlock = (
  app: App,
  revisionId: number,
  from: number,
  count: number,
): Promise<StoredVariant[]> =>
  app.db.select<StoredVariant>(
    `SELECT ordinal, mass, bolt_count, weld_volume, capacities, governing FROM variants
     WHERE revision_id = :revisionId AND ordinal >= :from AND ordinal < :to ORDER BY ordinal`,
    { revisionId, from, to: from + count },
  );

/** The cells of some variants, in no particular order. */
export const readCells = (
  app: App,
  revisionId: number,
  ordinals: readonly number[],
): Promise<StoredCells[]> =>
  app.db.select<StoredCells>(
    'SELECT ordinal, capacities, governing FROM variants WHERE revision_id = :revisionId AND ordinal IN (:ordinals)',
    { revisionId, ordinals },
  );

/** Some cells of one variant: kN rounded down to the increment or null, and what governs as on the wire. */
export function cellsOf(
  { capacities, governing }: StoredCells,
  first: number,
  count: number,
  increment: number,
): { capacity: (number | null)[]; governing: number[] } {
  const floats = floatsOf(capacities).subarray(first, first + count);
  return {
    capacity: Array.from(floats, (stored) => unpackCapacity(stored, increment)),
    governing: Array.from(governing.subarray(first, first + count), governingOf),
  };
}
