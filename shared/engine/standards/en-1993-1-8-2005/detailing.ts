import type { Detailing } from '../basis.ts';

/** Oversize clearance over the bolt, mm: 3 to M14, 4 to M22, 6 for M24, 8 above. EN 1090-2, Table 11 (from memory). */
function oversizeClearance(d: number): number {
  if (d <= 14) return 3;
  if (d <= 22) return 4;
  return d <= 24 ? 6 : 8;
}

/** Normal clearance over the bolt, mm: 1 to M14, 2 to M24, 3 above. EN 1090-2, Table 11 (from memory). */
export function normalClearance(d: number): number {
  if (d <= 14) return 1;
  return d <= 24 ? 2 : 3;
}

/** Spacing and edges, EN 1993-1-8:2005 Table 3.3 (normal round holes); welds, 4.5.1 and 4.5.2. */
export const detailing: Detailing = {
  clauses: {
    pitch: 'EN 1993-1-8 Table 3.3',
    edge: 'EN 1993-1-8 Table 3.3',
    end: 'EN 1993-1-8 Table 3.3',
    weldSize: 'EN 1993-1-8 4.5.2(2)',
    weldLength: 'EN 1993-1-8 4.5.1(2)',
    hole: 'EN 1090-2 Table 11',
  },
  leastPitch: (_d, d0) => 2.2 * d0,
  leastGauge: (_d, d0) => 2.4 * d0,
  greatestPitch: (t) => Math.min(14 * t, 200),
  leastEdge: (_d, d0) => 1.2 * d0,
  leastEnd: (_d, d0) => 1.2 * d0,
  greatestEdge: (t, exposed) => (exposed ? 4 * t + 40 : Infinity),
  leastWeldLeg: () => 0,
  greatestWeldLeg: () => Infinity,
  leastWeldThroat: () => 3,
  leastWeldLength: (leg) => Math.max(30, (6 * leg) / Math.SQRT2),
  greatestHole: (d) => d + oversizeClearance(d),
};
