import type { AlternativeStrength, StrengthBand } from '../types.ts';

/** Upper thickness limit, yield, tensile, other printed values. mm, MPa. */
type Row = readonly [tMax: number, fy: number, fu: number, alternatives?: readonly AlternativeStrength[]];

/** Spells a table of rows out as thickness bands, thinnest first. */
export function bands(...rows: readonly Row[]): readonly StrengthBand[] {
  return rows.map(([tMax, fy, fu, alternatives = []]) => ({ tMax, fy, fu, alternatives }));
}
