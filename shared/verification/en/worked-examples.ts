import {
  blockTearing,
  grossYield,
  netSectionResistance,
} from '../../engine/standards/en-1993-1-8-2005/index.ts';
import { bolt, type Diameter, en, grades } from '../bases.ts';
import { type Check, printed, type RoundedFirst, rounding } from '../check.ts';

const multiStorey = (place: string) =>
  `Steel Buildings in Europe, Multi-Storey Steel Buildings Part 5: Joint Design, ${place}`;
const singleStorey = (place: string) =>
  `Steel Buildings in Europe, Single-Storey Steel Buildings Part 5: Detailed Design of Trusses, Appendix B, ${place}`;
const common = { basis: 'en-1993-1-8-2005', evidence: 'found in text', unit: 'kN' } as const;
const none = Infinity;

interface Bolt {
  readonly d: Diameter;
  readonly d0: number;
  readonly grade: keyof typeof grades;
  readonly t: number;
  readonly fu: number;
}
const m20: Bolt = { d: 20, d0: 22, grade: '8.8', t: 10, fu: 430 };
const m24: Bolt = { d: 24, d0: 26, grade: '10.9', t: 15, fu: 510 };

/** Bearing of one bolt, kN: to the end, the next bolt ahead, the edge beside and the next bolt beside, mm. */
function bearing({ d, d0, grade, t, fu }: Bolt, e1: number, p1: number, e2: number, p2: number): number {
  const ply = en.bearing({
    size: bolt(d),
    grade: grades[grade],
    holeDiameter: d0,
    normalHole: d0,
    thickness: t,
    fu,
    singleLapOneRow: false,
    boltShear: none,
    deformationMatters: true,
  });
  return ply.bolt(e1, p1, e2, p2, null) / 1000;
}

const endFactor = rounding('α_b = 40/66', 0.61, 40 / 66);

function bearingCheck(
  id: string,
  source: string,
  inputs: string,
  text: string,
  ours: () => number,
  roundedFirst?: RoundedFirst,
): Check {
  const published = printed(text);
  const check = { ...common, id, clause: 'Table 3.4', source, inputs, published, ours };
  return roundedFirst === undefined ? check : { ...check, roundedFirst };
}

const finPlate = multiStorey('3.4 fin plate, p. 5-41');
const endPlate = multiStorey('2.4 partial depth end plate, p. 5-17');
const cleats = multiStorey('4.4 angle web cleats, p. 5-74');
const table = (name: string) => singleStorey(`Table ${name}`);

const bearings: readonly Check[] = [
  bearingCheck(
    'FIN-04',
    finPlate,
    'M20 8.8, t 10, fu 430, e1 40, p1 70, p2 60, e2 50',
    '89',
    () => bearing(m20, 40, 70, 50, 60),
    endFactor,
  ),
  bearingCheck(
    'FIN-05',
    finPlate,
    'the same, along the plate: end 50, pitch 60, edge 40, gauge 70',
    '114',
    () => bearing(m20, 50, 60, 40, 70),
    rounding('α_b = 60/66 − 1/4', 0.66, 60 / 66 - 0.25),
  ),
  bearingCheck(
    'PDE-01',
    endPlate,
    'M20 8.8, t 12, fu 430, end bolt e1 40, e2 30',
    '107',
    () => bearing({ ...m20, t: 12 }, 40, none, 30, none),
    endFactor,
  ),
  bearingCheck('PDE-02', endPlate, 'M20 8.8, t 12, fu 430, inner bolt p1 70, e2 30', '142', () =>
    bearing({ ...m20, t: 12 }, none, 70, 30, none),
  ),
  bearingCheck(
    'CLT-05',
    cleats,
    'M20 8.8, t 10, fu 430, end bolt e1 40, e2 40',
    '105',
    () => bearing(m20, 40, none, 40, none),
    endFactor,
  ),
  bearingCheck('CLT-06', cleats, 'M20 8.8, t 10, fu 430, inner bolt p1 70, e2 40', '139', () =>
    bearing(m20, none, 70, 40, none),
  ),
  bearingCheck(
    'TRS-01',
    table('B.10'),
    'M24 10.9, t 15, fu 510, p1 65, p2 68.24',
    '169.16',
    () => bearing(m24, none, 65, none, 68.24),
    { what: 'p_2 printed to 0.01 mm', share: (1.4 * 0.005) / 26 / ((1.4 * 68.24) / 26 - 1.7) },
  ),
  bearingCheck('TRS-02', table('B.10'), 'M24 10.9, t 15, fu 510, p1 65, e2 33', '158.84', () =>
    bearing(m24, none, 65, 33, none),
  ),
  bearingCheck('TRS-04', table('B.11'), 'M24 10.9, t 15, fu 510, e1 33, p2 65', '111.85', () =>
    bearing(m24, 33, none, none, 65),
  ),
  bearingCheck('TRS-06', table('B.16'), 'M24 10.9, t 15, fu 510, e1 80, p2 65', '264.38', () =>
    bearing(m24, 80, none, none, 65),
  ),
  bearingCheck(
    'GRP-02',
    'thestructuralengineer.info, calculation example of a shear bolt connection to EC3',
    'M20 8.8, t 20, fu 430, e1 60, e2 50, p1 100, p2 100',
    '309.6',
    () => bearing({ ...m20, t: 20 }, 60, 100, 50, 100),
    rounding('α_b = 60/66', 0.9, 60 / 66),
  ),
];

const block = (Ant: number, Anv: number, eccentric: boolean) =>
  blockTearing(Ant, Anv, 275, 430, eccentric, 1, 1.25) / 1000;
const blockCheck = (id: string, place: string, inputs: string, text: string, ours: () => number): Check => ({
  ...common,
  id,
  clause: '3.10.2',
  source: multiStorey(place),
  inputs,
  published: printed(text),
  ours,
});

const blocks: readonly Check[] = [
  blockCheck('FIN-09', '3.4 fin plate, p. 5-43', 'S275 (430): Ant 770, Anv 2210 mm², eccentric', '483', () =>
    block(770, 2210, true),
  ),
  blockCheck(
    'CLT-09',
    '4.4 angle web cleats, summary',
    'S275 (430), two cleats: Ant 290, Anv 2690 mm² each, eccentric',
    '954',
    () => 2 * block(290, 2690, true),
  ),
  blockCheck(
    'CLT-10',
    '4.4 angle web cleats, summary',
    'S275 (430), web: Ant 261, Anv 2871 mm², eccentric',
    '501',
    () => block(261, 2871, true),
  ),
  blockCheck(
    'SPL-01',
    '5.4 column splice, p. 5-96',
    'S275 (430): Ant 12 (2 × 55 − 22), Anv 2 × 12 (40 + 160 − 1.5 × 22) mm², even',
    '1000',
    () => block(12 * (2 * 55 - 22), 2 * 12 * (40 + 160 - 1.5 * 22), false),
  ),
];

const sections: readonly Check[] = [
  {
    ...common,
    id: 'SPL-02',
    clause: 'EN 1993-1-1 6.2.3(2)a',
    source: multiStorey('5.4 column splice, p. 5-96'),
    inputs: 'cover plate 260 × 12, S275',
    published: printed('858'),
    ours: () => grossYield(260 * 12, 275, 1) / 1000,
  },
  {
    ...common,
    id: 'SPL-03',
    clause: 'EN 1993-1-1 6.2.3(2)b',
    source: multiStorey('5.4 column splice, p. 5-96'),
    inputs: 'cover plate 260 × 12 less two holes of 22, fu 430',
    published: printed('802'),
    ours: () => netSectionResistance((260 - 2 * 22) * 12, 430, 1.25) / 1000,
  },
  {
    ...common,
    id: 'TRS-09',
    clause: 'EN 1993-1-1 6.2.4',
    source: singleStorey('p. 5-93'),
    inputs: 'L150x150x15, A 4302 mm², fy 355',
    published: printed('1527.2'),
    ours: () => grossYield(4302, 355, 1) / 1000,
  },
  {
    ...common,
    id: 'TRS-10',
    clause: 'EN 1993-1-1 6.2.3(2)b',
    source: singleStorey('p. 5-109'),
    inputs: 'Anet 3588 mm², fu 510',
    published: printed('1317.52'),
    ours: () => netSectionResistance(3588, 510, 1.25) / 1000,
    roundedFirst: { what: 'A_net printed to the mm²', share: 0.5 / 3588 },
  },
];

export const enWorkedExamples: readonly Check[] = [...bearings, ...blocks, ...sections];
