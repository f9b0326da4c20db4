import type { BoltGrade, BoltSize } from '../engine/index.ts';
import { createBasis } from '../engine/standards/registry.ts';

const found = <T>(value: T | undefined): T => {
  if (value === undefined) throw new Error('a design basis is missing');
  return value;
};

/** With the recommended partial factors: 1.00, 1.00, 1.25. */
export const en = found(createBasis('en-1993-1-8-2005'));
export const sans = found(createBasis('sans-10162-1-2011'));

/** Tensile stress areas, mm2: ISO 898-1. */
const stressAreas = { 12: 84.3, 16: 157, 20: 245, 22: 303, 24: 353, 27: 459, 30: 561, 36: 817 } as const;
export type Diameter = keyof typeof stressAreas;

/** A metric bolt by its diameter, mm. */
export const bolt = (d: Diameter): BoltSize => ({ name: `M${d}`, d, stressArea: stressAreas[d] });

/** EN 1993-1-8:2005 Table 3.1, MPa. */
export const grades = {
  '4.6': { name: '4.6', fyb: 240, fub: 400 },
  '8.8': { name: '8.8', fyb: 640, fub: 800 },
  '10.9': { name: '10.9', fyb: 900, fub: 1000 },
} as const satisfies Record<string, BoltGrade>;

/** Holes of the published EN tables: 2 mm clearance to M24, 3 mm above. */
export const tableHole = (d: number): number => (d <= 24 ? d + 2 : d + 3);
