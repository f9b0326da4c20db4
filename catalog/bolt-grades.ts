import type { BoltGradeRecord, Practice, TensileBand } from './types.ts';

/** The largest diameter that ISO 898-1 gives property classes for, mm. */
const LARGEST = 39;

const propertyClass = {
  source: 'Nominal: EN 1993-1-8 Table 3.1. Minimum: ISO 898-1 Table 3, minimum tensile strength R_m',
  edition: 'EN 1993-1-8:2005; ISO 898-1:2013',
  evidence: 'from memory; nominal f_ub of 4.6 and 8.8 seen in published resistance tables',
};
const assembly = {
  source: 'ASTM F3125, minimum tensile strength',
  edition: 'ASTM F3125/F3125M-19',
  evidence: 'read in published handbook notes',
};

/** Class, nominal f_yb, nominal f_ub, minimum by diameter. */
type Row = readonly [string, number, number, readonly TensileBand[]];

const upTo = (fub: number): readonly TensileBand[] => [{ dMax: LARGEST, fub }];

const rows: readonly Row[] = [
  ['4.6', 240, 400, upTo(400)],
  ['4.8', 320, 400, upTo(420)],
  ['5.6', 300, 500, upTo(500)],
  ['5.8', 400, 500, upTo(520)],
  ['6.8', 480, 600, upTo(600)],
  [
    '8.8',
    640,
    800,
    [
      { dMax: 16, fub: 800 },
      { dMax: LARGEST, fub: 830 },
    ],
  ],
  ['10.9', 900, 1000, upTo(1040)],
];

function fromClass([name, fyb, fub, minimum]: Row): BoltGradeRecord {
  const practices: readonly Practice[] = ['en', 'sans'];
  const nominal = { fyb, fub };
  return {
    name,
    family: 'property-class',
    dMin: 1.6,
    dMax: LARGEST,
    nominal,
    minimum,
    practices,
    ...propertyClass,
    missing: [],
  };
}

function fromAssembly(name: string, fub: number): BoltGradeRecord {
  return {
    name,
    family: 'structural-assembly',
    dMin: 12,
    dMax: 36,
    nominal: null,
    minimum: [{ dMax: 36, fub }],
    practices: ['csa', 'aisc'],
    ...assembly,
    missing: [{ field: 'nominal', reason: 'EN 1993-1-8 Table 3.1 does not have this grade' }],
  };
}

/** ISO property classes and metric ASTM structural bolt grades. MPa. */
export const boltGrades: readonly BoltGradeRecord[] = [
  ...rows.map(fromClass),
  fromAssembly('A325M', 830),
  fromAssembly('A490M', 1040),
];
