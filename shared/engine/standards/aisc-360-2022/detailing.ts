import type { Detailing } from '../basis.ts';

/** Bolt diameter and least edge distance, mm. */
const tableJ34M: readonly (readonly [d: number, edge: number])[] = [
  [12, 18],
  [16, 22],
  [20, 26],
  [22, 28],
  [24, 30],
  [27, 34],
  [30, 38],
  [36, 46],
];

/**
 * Least distance from the centre of a standard hole to any edge, mm: the row of ANSI/AISC 360-22 Table J3.4M for this
 * size or the next larger one; beyond M36 1.25 d.
 */
export function leastEdgeDistance(d: number): number {
  const row = tableJ34M.find(([size]) => size >= d);
  return row === undefined ? 1.25 * d : row[1];
}

/** Least fillet leg by the thinner part joined, mm: 3 to 6 mm, 5 to 13, 6 to 19, 8 above. ANSI/AISC 360-22, Table J2.4. */
export function leastFilletLeg(thinner: number): number {
  if (thinner <= 6) return 3;
  if (thinner <= 13) return 5;
  return thinner <= 19 ? 6 : 8;
}

/** Clearance of a standard hole, mm: 2 below M24, 3 from M24 up. ANSI/AISC 360-22, Table J3.3M. */
export function standardClearance(d: number): number {
  return d < 24 ? 2 : 3;
}

/** Least distance between centres, mm: `2 2/3 d`, and d clear between the holes. ANSI/AISC 360-22, J3.4. */
export function leastSpacing(d: number, dh: number): number {
  return Math.max((8 / 3) * d, dh + d);
}

/** Spacing, edges, holes and weld sizes. ANSI/AISC 360-22, J2.2b, J3.3 to J3.6. */
export const detailing: Detailing = {
  clauses: {
    pitch: 'AISC 360 J3.4, J3.6',
    edge: 'AISC 360 J3.5, Table J3.4M, J3.6',
    end: 'AISC 360 J3.5, Table J3.4M',
    weldSize: 'AISC 360 Table J2.4',
    weldLength: 'AISC 360 J2.2b(c)',
    hole: 'AISC 360 Table J3.3M',
  },
  leastPitch: leastSpacing,
  leastGauge: leastSpacing,
  greatestPitch: (t) => Math.min(24 * t, 300),
  leastEdge: (d) => leastEdgeDistance(d),
  leastEnd: (d) => leastEdgeDistance(d),
  greatestEdge: (t) => Math.min(12 * t, 150),
  leastWeldLeg: (_thicker, thinner) => leastFilletLeg(thinner),
  leastWeldThroat: () => 0,
  leastWeldLength: (leg) => 4 * leg,
  greatestHole: (d) => d + standardClearance(d),
};
