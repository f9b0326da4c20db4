import { groupWidth, type UprightGroup } from '../../limit-states/upright-group.ts';
import type { Resolved } from '../resolved.ts';

/**
 * What each part's moment is for a shear of 1 N, mm, by where the shear acts: at the face of the support, in the
 * middle of the bolts, or both with the worse kept.
 */
export interface Lines {
  readonly eccentricity: number;
  /** Moment on the bolts about their middle, once for each line. */
  readonly boltLevers: readonly number[];
  readonly weldLever: number;
  /** From the face of the support to the nearest line of shear. */
  readonly nearest: number;
  /** At the column nearest to the support. */
  readonly columnLever: number;
}

/** Reads the line of shear and the eccentricity. */
export function linesOf(values: Resolved, group: UprightGroup, firstColumn: number): Lines {
  const given = values.number('eccentricity');
  const half = groupWidth(group) / 2;
  const eccentricity = given === 0 ? firstColumn + half : given;
  const line = values.choice<'both' | 'support' | 'bolts'>('shear_line');
  const atSupport = line !== 'bolts';
  const atBolts = line !== 'support';
  return {
    eccentricity,
    boltLevers: [...(atSupport ? [-eccentricity] : []), ...(atBolts ? [0] : [])],
    weldLever: atBolts ? eccentricity : 0,
    nearest: atSupport ? 0 : eccentricity,
    columnLever: Math.max(atSupport ? eccentricity - half : 0, atBolts ? half : 0),
  };
}
