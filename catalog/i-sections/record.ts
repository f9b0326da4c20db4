import { massPerMetre } from '../mass.ts';
import type { ISectionRecord, ISectionSeries } from '../types.ts';

/** Name, depth, width, web, flange, root radius, printed area. mm, mm2. */
export type ISectionRow = readonly [
  name: string,
  h: number,
  b: number,
  tw: number,
  tf: number,
  r: number,
  A: number,
];

const provenance = {
  source: 'EN 10365 section table: dimensions and area',
  edition: 'EN 10365:2017',
  evidence: 'from memory; area confirmed from geometry within 0.6 %; mass from the area',
};

/** One rolled I or H section of EN 10365. */
export function iSection(series: ISectionSeries, row: ISectionRow): ISectionRecord {
  const [name, h, b, tw, tf, r, A] = row;
  return { name, series, h, b, tw, tf, r, A, mass: massPerMetre(A), ...provenance, missing: [] };
}
