import type { AiscStressBand, BoltGradeRecord, Practice, TensileBand } from './types.ts';

/** The largest diameter that ISO 898-1 gives property classes for, mm. */
const LARGEST = 39;

const propertyClass = {
  source:
    'Nominal: EN 1993-1-8 Table 3.1. Minimum: ISO 898-1 Table 3, minimum tensile strength R_m. ' +
    'AISC: 0.75, 0.450 and 0.563 of the minimum strength, not above Group 120 (8.8) and Group 150 (10.9) of ' +
    'ANSI/AISC 360 Table J3.2, rounded down to whole MPa',
  edition: 'EN 1993-1-8:2005; ISO 898-1:2013; ANSI/AISC 360-22',
  evidence: 'from memory; nominal f_ub of 4.6 and 8.8 seen in published resistance tables',
};
const assembly = {
  source:
    'ASTM F3125, minimum tensile and yield strength. AISC: ANSI/AISC 360 Table J3.2, Group 120 (A325M, A325), Group 150 (A490M, A490), A307',
  edition: 'ASTM F3125/F3125M-19; ANSI/AISC 360-22',
  evidence:
    'tensile strength read in published handbook notes; yield from memory; table in ksi read, its MPa from memory',
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

/** Group 120 and Group 150 of AISC 360 Table J3.2, MPa. */
const group120 = { fnt: 620, fnvN: 372, fnvX: 469 };
const group150 = { fnt: 780, fnvN: 469, fnvX: 579 };
const noGroup = { fnt: Infinity, fnvN: Infinity, fnvX: Infinity };
const groupOf: Readonly<Record<string, Omit<AiscStressBand, 'dMax'>>> = { '8.8': group120, '10.9': group150 };

/** Table J3.2 for a threaded part of tensile strength `fub`, never above the group that the class stands beside. */
function threadedPart({ dMax, fub }: TensileBand, group: Omit<AiscStressBand, 'dMax'>): AiscStressBand {
  return {
    dMax,
    fnt: Math.floor(Math.min(0.75 * fub, group.fnt)),
    fnvN: Math.floor(Math.min(0.45 * fub, group.fnvN)),
    fnvX: Math.floor(Math.min(0.563 * fub, group.fnvX)),
  };
}

function fromClass([name, fyb, fub, minimum]: Row): BoltGradeRecord {
  const practices: readonly Practice[] = ['en', 'sans', 'csa', 'aisc'];
  const nominal = { fyb, fub };
  return {
    name,
    family: 'property-class',
    dMin: 1.6,
    dMax: LARGEST,
    nominal,
    minimum,
    fyb,
    aisc: minimum.map((band) => threadedPart(band, groupOf[name] ?? noGroup)),
    practices,
    ...propertyClass,
    missing: [],
  };
}

interface AssemblyRow {
  readonly name: string;
  /** Smallest and largest diameter, mm. */
  readonly sizes: readonly [number, number];
  readonly fyb: number;
  readonly fub: number;
  readonly group: Omit<AiscStressBand, 'dMax'>;
}

function fromAssembly({ name, sizes, fyb, fub, group }: AssemblyRow): BoltGradeRecord {
  const [dMin, dMax] = sizes;
  return {
    name,
    family: 'structural-assembly',
    dMin,
    dMax,
    nominal: null,
    minimum: [{ dMax, fub }],
    fyb,
    aisc: [{ dMax, ...group }],
    practices: ['csa', 'aisc'],
    ...assembly,
    missing: [{ field: 'nominal', reason: 'EN 1993-1-8 Table 3.1 does not have this grade' }],
  };
}

/** Strengths of inch bolts, printed in ksi. */
const ksi = (value: number): number => Math.round(value * 68.94757) / 10;
const inches = [12.7, 38.1] as const;
const inchGrades: readonly AssemblyRow[] = [
  {
    name: 'A325',
    sizes: inches,
    fyb: ksi(92),
    fub: ksi(120),
    group: { fnt: ksi(90), fnvN: ksi(54), fnvX: ksi(68) },
  },
  {
    name: 'A490',
    sizes: inches,
    fyb: ksi(130),
    fub: ksi(150),
    group: { fnt: ksi(113), fnvN: ksi(68), fnvX: ksi(84) },
  },
  {
    name: 'A307',
    sizes: inches,
    fyb: ksi(36),
    fub: ksi(60),
    group: { fnt: ksi(45), fnvN: ksi(27), fnvX: ksi(27) },
  },
];

/** ISO property classes, and ASTM structural bolt grades metric and in inches. MPa. */
export const boltGrades: readonly BoltGradeRecord[] = [
  ...rows.map(fromClass),
  fromAssembly({ name: 'A325M', sizes: [12, 36], fyb: 660, fub: 830, group: group120 }),
  fromAssembly({ name: 'A490M', sizes: [12, 36], fyb: 940, fub: 1040, group: group150 }),
  ...inchGrades.map(fromAssembly),
];
