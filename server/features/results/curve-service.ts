import type { Curve } from '@shared/contracts/revisions.ts';
import type { Sense } from '@shared/engine/index.ts';
import { capacityCurve, valuesOfRange } from '@shared/engine/sweep/index.ts';
import type { App } from '../../context.ts';
import { cellsOf, readCells } from './stored-cells.ts';
import { existingVariant, placeOfSense, prepareVariant, type SweptRevision } from './swept-revision.ts';

/** The envelope alone: what a variant carries over the load angle. */
export interface Envelope {
  /** Degrees. */
  angles: number[];
  /** kN, rounded down. */
  capacity: (number | null)[];
  governing: number[];
}

/** Every angle of the kind, degrees. */
export const anglesOfKind = ({ kind }: SweptRevision, step: number): number[] =>
  valuesOfRange(kind.angleRange.minimum, kind.angleRange.maximum, step);

/** What is stored for one variant and sense, at the angles that were swept. */
export async function storedCurve(
  app: App,
  swept: SweptRevision,
  ordinal: number,
  sense: Sense,
): Promise<Envelope> {
  const { row, angles, summary } = swept;
  const first = placeOfSense(swept, sense) * angles.length;
  const [stored] = await readCells(app, row.id, [ordinal]);
  if (!stored) throw new Error(`Revision ${row.id} has no variant ${ordinal}`);
  return { angles: [...angles], ...cellsOf(stored, first, angles.length, summary.increment) };
}

/**
 * The curve of a variant in steps of the load angle (degrees) with every limit state, kN. A revision of another
 * engine answers with its stored cells instead.
 * @throws {ProblemError} not-found, validation
 */
export async function viewCurve(
  app: App,
  swept: SweptRevision,
  ordinal: number,
  { sense, step }: { sense: Sense; step: number },
): Promise<Curve> {
  existingVariant(swept, ordinal);
  placeOfSense(swept, sense);
  if (!swept.current) return { ...(await storedCurve(app, swept, ordinal, sense)), limitStates: [] };
  const angles = anglesOfKind(swept, step);
  const prepared = prepareVariant(swept, ordinal);
  if (!prepared.ok) {
    return { angles, capacity: angles.map(() => null), governing: angles.map(() => -1), limitStates: [] };
  }
  const { detail } = prepared;
  const { capacity, governing, limitStates } = capacityCurve(detail, sense, angles, swept.summary.increment);
  const named = detail.limitStates.map(({ id, code, title, part }, index) => ({
    id,
    code,
    title,
    part,
    capacity: limitStates[index] ?? [],
  }));
  return { angles, capacity, governing, limitStates: named };
}
