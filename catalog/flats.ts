import { massPerMetre } from './mass.ts';
import type { FlatRecord } from './types.ts';

/** Width and the usual thicknesses of that width, mm. */
const rows: readonly (readonly [b: number, thicknesses: readonly number[]])[] = [
  [20, [5]],
  [25, [5, 6]],
  [30, [5, 6, 8]],
  [40, [5, 6, 8, 10]],
  [50, [5, 6, 8, 10, 12]],
  [60, [5, 6, 8, 10, 12, 15]],
  [70, [6, 8, 10, 12, 15]],
  [80, [6, 8, 10, 12, 15, 20]],
  [90, [6, 8, 10, 12, 15, 20]],
  [100, [6, 8, 10, 12, 15, 20, 25]],
  [120, [6, 8, 10, 12, 15, 20, 25]],
  [130, [8, 10, 12, 15, 20, 25]],
  [140, [8, 10, 12, 15, 20, 25]],
  [150, [8, 10, 12, 15, 20, 25, 30]],
];

function record(b: number, t: number): FlatRecord {
  const A = b * t;
  return {
    name: `FL${b}x${t}`,
    b,
    t,
    A,
    mass: massPerMetre(A),
    source: 'EN 10058 preferred widths and thicknesses; area is width times thickness',
    edition: 'EN 10058:2018',
    evidence: 'usual sizes, from memory; area and mass are exact by geometry',
    missing: [],
  };
}

/** Hot-rolled flat bars. Wider pieces are plate. mm, mm2. */
export const flats: readonly FlatRecord[] = rows.flatMap(([b, thicknesses]) =>
  thicknesses.map((t) => record(b, t)),
);
