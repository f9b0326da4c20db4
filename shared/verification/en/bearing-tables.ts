import { alphaB, bearingResistance, edgeFactor } from '../../engine/standards/en-1993-1-8-2005/index.ts';
import { bolt, type Diameter, en, grades, tableHole } from '../bases.ts';
import { type Check, printed, threeFigures } from '../check.ts';

const thicknesses = [5, 6, 7, 8, 9, 10, 12, 15, 20, 25, 30] as const;
const orangeBook = 'ArcelorMittal Orange Book (resistance tables to EN 1993-1-8), bolts and welds, node';

/** d, e1, e2, p1, p2, mm, then kN by thickness; every cell is printed to three significant figures. */
type Row = readonly [d: Diameter, e1: number, e2: number, p1: number, p2: number, kN: readonly number[]];

/** Hexagon bolts of class 4.6 in S355. */
const hexagon: readonly Row[] = [
  [12, 25, 20, 35, 40, [30.3, 36.3, 42.4, 48.4, 54.5, 60.5, 72.6, 90.8, 121, 151, 182]],
  [16, 35, 25, 50, 50, [42.7, 51.2, 59.7, 68.3, 76.8, 85.4, 102, 128, 171, 213, 256]],
  [20, 40, 30, 60, 60, [48.3, 57.9, 67.6, 77.2, 86.9, 96.5, 116, 145, 193, 241, 290]],
  [24, 50, 35, 70, 70, [59.8, 71.8, 83.8, 95.8, 108, 120, 144, 180, 239, 299, 359]],
  [30, 60, 45, 85, 90, [72.4, 86.9, 101, 116, 130, 145, 174, 217, 290, 362, 434]],
];

/** Countersunk bolts of class 8.8 in S355, wider spacings; a printed 0 says nothing and is left out. */
const countersunk: readonly Row[] = [
  [12, 40, 25, 50, 45, [21.2, 31.8, 42.4, 53.0, 63.7, 74.3, 95.5, 127, 180, 233, 286]],
  [16, 50, 30, 65, 55, [13.9, 27.9, 41.8, 55.7, 69.6, 83.6, 111, 153, 223, 292, 362]],
  [20, 60, 35, 80, 70, [0, 17.1, 34.2, 51.3, 68.4, 85.5, 120, 171, 256, 342, 427]],
  [24, 75, 40, 95, 80, [0, 0, 21.7, 43.4, 65.1, 86.8, 130, 195, 304, 412, 521]],
  [30, 90, 50, 115, 100, [0, 0, 0, 12.8, 38.5, 64.1, 115, 192, 320, 449, 577]],
];

const spacings = (d: number, e1: number, e2: number, p1: number, p2: number) =>
  `M${d}, hole ${tableHole(d)}, e1 ${e1}, e2 ${e2}, p1 ${p1}, p2 ${p2}`;

const hexagonCell = ([d, e1, e2, p1, p2, kN]: Row, column: number): Check => ({
  id: `bearing-4.6-S355-M${d}-t${thicknesses[column]}`,
  basis: 'en-1993-1-8-2005',
  clause: 'Table 3.4',
  source: `${orangeBook} 45`,
  evidence: 'found in text',
  inputs: `${spacings(d, e1, e2, p1, p2)}, t ${thicknesses[column]}, fu 470, fub 400`,
  published: threeFigures(kN[column]!),
  unit: 'kN',
  ours: () => {
    const holeDiameter = tableHole(d);
    const ply = en.bearing({
      size: bolt(d),
      grade: grades['4.6'],
      holeDiameter,
      normalHole: holeDiameter,
      thickness: thicknesses[column]!,
      fu: 470,
      singleLapOneRow: false,
      boltShear: Infinity,
      deformationMatters: true,
    });
    return ply.bolt(e1, p1, e2, p2, null) / 1000;
  },
});

const countersunkCell = ([d, e1, e2, p1, p2, kN]: Row, column: number): Check => ({
  id: `bearing-countersunk-8.8-S355-M${d}-t${thicknesses[column]}`,
  basis: 'en-1993-1-8-2005',
  clause: 'Table 3.4',
  source: `${orangeBook} 65`,
  evidence: 'found in text',
  inputs: `${spacings(d, e1, e2, p1, p2)}, t ${thicknesses[column]} less d/4, fu 470, fub 800`,
  published: threeFigures(kN[column]!),
  unit: 'kN',
  ours: () => {
    const ab = alphaB(e1, p1, tableHole(d), 800 / 470);
    const k1 = edgeFactor(e2, p2, tableHole(d));
    return bearingResistance(k1, ab, 470, d, thicknesses[column]! - d / 4, 1.25) / 1000;
  },
  weak: 'half of the sink taken as d/4, which is inferred from the table itself',
});

const cells = (rows: readonly Row[], cell: (row: Row, column: number) => Check) =>
  rows.flatMap((row) => row[5].flatMap((kN, column) => (kN > 0 ? [cell(row, column)] : [])));

/** The two cells of the S275 table that are remembered. */
const recalled: readonly Check[] = (
  [
    [10, '84.2'],
    [12, '101'],
  ] as const
).map(([t, text]) => ({
  id: `bearing-S275-M20-t${t}`,
  basis: 'en-1993-1-8-2005',
  clause: 'Table 3.4',
  source: 'SCI P363, bearing in S275',
  evidence: 'from memory',
  inputs: `${spacings(20, 40, 30, 60, 60)}, t ${t}, fu 410`,
  published: printed(text),
  unit: 'kN',
  ours: () =>
    bearingResistance(edgeFactor(30, 60, 22), alphaB(40, 60, 22, 800 / 410), 410, 20, t, 1.25) / 1000,
}));

export const enBearingTables: readonly Check[] = [
  ...cells(hexagon, hexagonCell),
  ...cells(countersunk, countersunkCell),
  ...recalled,
];
