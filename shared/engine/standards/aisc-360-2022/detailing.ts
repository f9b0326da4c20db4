import type { Detailing } from '../basis.ts';

const INCH = 25.4;

/** Bolt diameter and least edge distance, mm: Table J3.4M, and between its rows those of Table J3.4 in inches. */
const tableJ34: readonly (readonly [d: number, edge: number])[] = [
  [12, 18],
  [0.5 * INCH, 0.75 * INCH],
  [0.625 * INCH, 0.875 * INCH],
  [16, 22],
  [0.75 * INCH, INCH],
  [20, 26],
  [22, 28],
  [0.875 * INCH, 1.125 * INCH],
  [24, 30],
  [INCH, 1.25 * INCH],
  [27, 34],
  [1.125 * INCH, 1.5 * INCH],
  [30, 38],
  [1.25 * INCH, 1.625 * INCH],
  [36, 46],
];

/**
 * Least distance from the centre of a standard hole to any edge, mm: the row of ANSI/AISC 360-22 Table J3.4M or
 * J3.4 for this size or the next larger one; beyond M36 1.25 d.
 */
export function leastEdgeDistance(d: number): number {
  const row = tableJ34.find(([size]) => size >= d);
  return row === undefined ? 1.25 * d : row[1];
}

/**
 * Least fillet leg by the thinner part joined, mm: 3 to 6 mm, 5 to 13, 6 to 19, 8 above, and where the table in inches
 * is lower its value: 3/16 in and 5/16 in. ANSI/AISC 360-22, Tables J2.4M and J2.4.
 */
export function leastFilletLeg(thinner: number): number {
  if (thinner <= INCH / 4) return 3;
  if (thinner <= 13) return (3 / 16) * INCH;
  return thinner <= 0.75 * INCH ? 6 : (5 / 16) * INCH;
}

/** Clearance of a standard hole, mm: 2 below M24, 3 from M24 up. ANSI/AISC 360-22, Table J3.3M. */
export function standardClearance(d: number): number {
  return d < 24 ? 2 : 3;
}

/** Greatest standard hole, mm: Table J3.3M, and 1/8 in over an inch bolt from 1 in up. ANSI/AISC 360-22, Table J3.3. */
export function greatestHole(d: number): number {
  return d < 24 ? d + 2 : d + INCH / 8;
}

/** Least distance between centres, mm: `2 2/3 d`, and d clear between the holes. ANSI/AISC 360-22, J3.4. */
export function leastSpacing(d: number, dh: number): number {
  return Math.max((8 / 3) * d, dh + d);
}

/** Greatest fillet leg along the edge of a part, mm: t, and t − 2 from 6 mm up. ANSI/AISC 360-22, J2.2b(b). */
export function greatestFilletLeg(t: number): number {
  return t < 6 ? t : t - 2;
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
  greatestWeldLeg: greatestFilletLeg,
  leastWeldThroat: () => 0,
  leastWeldLength: (leg) => 4 * leg,
  greatestHole,
};
