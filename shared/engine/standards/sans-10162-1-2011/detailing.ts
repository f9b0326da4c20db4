import type { Detailing, EdgeFinish } from '../basis.ts';

/** Bolt diameter, least edge distance at a sheared edge, at a rolled, sawn or gas-cut edge. mm. */
const table6: readonly (readonly [d: number, sheared: number, rolled: number])[] = [
  [16, 28, 22],
  [20, 34, 26],
  [22, 38, 28],
  [24, 42, 30],
  [27, 48, 34],
  [30, 52, 38],
  [36, 64, 46],
];

/**
 * Least edge distance, mm: the row of SANS 10162-1:2011 Table 6 for this size or the next larger one; beyond
 * M36 1.75 d sheared, 1.25 d rolled. Below M16 the M16 row is taken in proportion: 1.75 d and 1.375 d.
 */
export function leastEdgeDistance(d: number, finish: EdgeFinish): number {
  if (d < 16) return (finish === 'sheared' ? 1.75 : 1.375) * d;
  const row = table6.find(([size]) => size >= d);
  if (row === undefined) return (finish === 'sheared' ? 1.75 : 1.25) * d;
  return finish === 'sheared' ? row[1] : row[2];
}

/** Least fillet leg by the thicker part joined, mm: 5 to 12 mm, 6 to 20 mm, 8 above. */
export function leastFilletLeg(thicker: number): number {
  if (thicker <= 12) return 5;
  return thicker <= 20 ? 6 : 8;
}

/** Greatest fillet leg along the edge of a part, mm: t, and t − 2 from 6 mm up. Welding practice to SANS 10162-1. */
export function greatestFilletLeg(t: number): number {
  return t < 6 ? t : t - 2;
}

/** Spacing, edges, holes and weld sizes. SANS 10162-1:2011, clause 22.3 and Table 6; weld sizes by its welding practice. */
export const detailing: Detailing = {
  clauses: {
    pitch: 'SANS 10162-1 22.3.1',
    edge: 'SANS 10162-1 22.3.2, Table 6, and 22.3.3',
    end: 'SANS 10162-1 22.3.4',
    weldSize: 'welding practice to SANS 10162-1 13.13',
    weldLength: 'SANS 10162-1 13.13',
    hole: 'SANS 10162-1 22.3.5',
  },
  leastPitch: (d) => 2.7 * d,
  leastGauge: (d) => 2.7 * d,
  greatestPitch: () => Infinity,
  leastEdge: (d, _d0, finish) => leastEdgeDistance(d, finish),
  leastEnd: (d, _d0, finish, boltsInLine) =>
    Math.max(leastEdgeDistance(d, finish), boltsInLine <= 2 ? 1.5 * d : 0),
  greatestEdge: (t) => Math.min(12 * t, 150),
  leastWeldLeg: leastFilletLeg,
  greatestWeldLeg: greatestFilletLeg,
  leastWeldThroat: () => 0,
  leastWeldLength: (leg) => Math.max(40, 4 * leg),
  // M24 may have 27 mm; from M27 up the fabrication standard allows 3 mm.
  greatestHole: (d) => (d >= 24 ? d + 3 : d + 2),
};
