import { boltTensionResistance, punchingResistance } from '../../engine/standards/en-1993-1-8-2005/index.ts';
import { bolt, type Diameter, en, grades, tableHole } from '../bases.ts';
import { type Check, type Evidence, printed } from '../check.ts';

const orangeBook = (nodes: string) =>
  `ArcelorMittal Orange Book (resistance tables to EN 1993-1-8), bolts and welds, node ${nodes}`;
const fromMemory = 'SCI P363, non-preloaded bolts, γM2 1.25';
const gammaM2 = 1.25;

type Row = readonly [d: Diameter, printed: string];
type GradeName = keyof typeof grades;

function shear(grade: GradeName, rows: readonly Row[], source: string, evidence: Evidence): Check[] {
  return rows.map(([d, text]) => ({
    id: `bolt-shear-${grade}-M${d}`,
    basis: 'en-1993-1-8-2005',
    clause: d === 12 && grade !== '4.6' ? 'Table 3.4, 3.6.1(5)' : 'Table 3.4',
    source,
    evidence,
    inputs: `M${d} ${grade}, one plane, threads in it, hole ${tableHole(d)} mm`,
    published: printed(text),
    unit: 'kN',
    ours: () => shearOf(d, grade, 1),
  }));
}

function shearOf(d: Diameter, grade: GradeName, planes: number): number {
  const size = bolt(d);
  const holeDiameter = tableHole(d);
  const given = { size, grade: grades[grade], holeDiameter, planes, threadsInPlane: true, jointLength: 0 };
  return en.boltShear(given, null) / 1000;
}

function tension(
  id: string,
  grade: GradeName,
  k2: number,
  rows: readonly Row[],
  source: string,
  evidence: Evidence,
): Check[] {
  return rows.map(([d, text]) => ({
    id: `${id}-${grade}-M${d}`,
    basis: 'en-1993-1-8-2005',
    clause: 'Table 3.4',
    source,
    evidence,
    inputs: `M${d} ${grade}, k2 ${k2}`,
    published: printed(text),
    unit: 'kN',
    ours: () => boltTensionResistance({ k2, fub: grades[grade].fub, As: bolt(d).stressArea, gammaM2 }) / 1000,
  }));
}

/** Least thickness for which a 4.6 bolt is not weaker in punching than in tension. */
const punching: Check[] = (
  [
    [12, 17.73, '1.9'],
    [16, 23.67, '2.7'],
    [20, 29.67, '3.4'],
    [24, 35.38, '4.1'],
    [30, 45.0, '5.1'],
  ] as const
).map(([d, dm, text]) => ({
  id: `punching-4.6-M${d}`,
  basis: 'en-1993-1-8-2005',
  clause: 'Table 3.4',
  source: orangeBook('45'),
  evidence: 'found in text',
  inputs: `M${d} 4.6, fu 470, dm ${dm}: thickness with Bp,Rd = Ft,Rd`,
  published: printed(text),
  unit: 'mm',
  ours: () =>
    boltTensionResistance({ fub: 400, As: bolt(d).stressArea, gammaM2 }) /
    punchingResistance({ dm, tp: 1, fu: 470, gammaM2 }),
  weak: 'the width across flats (ISO 4014, from memory) is the reading of dm that fits the print',
}));

const double: Check = {
  id: 'bolt-shear-8.8-M20-double',
  basis: 'en-1993-1-8-2005',
  clause: 'Table 3.4',
  source: 'thestructuralengineer.info, calculation example of a shear bolt connection to EC3',
  evidence: 'found in text',
  inputs: 'M20 8.8, two planes, threads in them',
  published: printed('188.2'),
  unit: 'kN',
  ours: () => shearOf(20, '8.8', 2),
};

export const enBolts: readonly Check[] = [
  ...shear(
    '4.6',
    [
      [12, '16.2'],
      [16, '30.1'],
      [20, '47.0'],
      [24, '67.8'],
      [30, '108'],
    ],
    orangeBook('45'),
    'found in text',
  ),
  ...shear(
    '8.8',
    [
      [12, '27.5'],
      [16, '60.3'],
      [20, '94.1'],
      [24, '136'],
      [30, '215'],
    ],
    orangeBook('50, 65'),
    'found in text',
  ),
  ...shear(
    '10.9',
    [
      [12, '28.7'],
      [16, '62.8'],
      [20, '98.0'],
      [24, '141'],
      [30, '224'],
    ],
    fromMemory,
    'from memory',
  ),
  double,
  ...tension(
    'bolt-tension',
    '4.6',
    0.9,
    [
      [12, '24.3'],
      [16, '45.2'],
      [20, '70.6'],
      [24, '102'],
      [30, '162'],
    ],
    orangeBook('45'),
    'found in text',
  ),
  ...tension(
    'bolt-tension',
    '8.8',
    0.9,
    [
      [12, '48.6'],
      [16, '90.4'],
      [20, '141'],
      [24, '203'],
      [30, '323'],
    ],
    fromMemory,
    'from memory',
  ),
  ...tension(
    'bolt-tension',
    '10.9',
    0.9,
    [
      [12, '60.7'],
      [16, '113'],
      [20, '176'],
      [24, '254'],
      [30, '404'],
    ],
    fromMemory,
    'from memory',
  ),
  ...tension(
    'bolt-tension-countersunk',
    '8.8',
    0.63,
    [
      [12, '34.0'],
      [16, '63.3'],
      [20, '98.8'],
      [24, '142'],
      [30, '226'],
    ],
    orangeBook('65'),
    'found in text',
  ),
  ...punching,
];
