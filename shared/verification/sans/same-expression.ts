import {
  boltShearResistance,
  boltTensionResistance,
  filletWeldMetal,
  grossYield,
  leastEdgeDistance,
  leastFilletLeg,
} from '../../engine/standards/sans-10162-1-2011/index.ts';
import { sans } from '../bases.ts';
import { type Check, type Printed, printed, rounding, threeFigures } from '../check.ts';

/*
 * No worked example to SANS 10162-1 itself could be read. These are printed for CSA S16, from which the clause of
 * SANS is taken over: the same expression with the same factor, so the same inputs must give the same number.
 */
const notes = (example: string) => `Carleton University CIVE 3205 course notes (to CSA S16-14), ${example}`;
const weak = 'printed for CSA S16, whose clause has the same expression and the same factor';
const shank = (d: number) => (Math.PI * d * d) / 4;

function same(
  id: string,
  clause: string,
  example: string,
  inputs: string,
  published: Printed,
  unit: string,
  ours: () => number,
): Check {
  return {
    id,
    basis: 'sans-10162-1-2011',
    clause,
    source: notes(example),
    evidence: 'found in text',
    inputs,
    published,
    unit,
    ours,
    weak,
  };
}

const shear = (bolts: number, m: number, d: number, fub: number, threadsIntercepted = true) =>
  (bolts * boltShearResistance({ m, Ab: shank(d), fub, threadsIntercepted })) / 1000;
const tension = (bolts: number, d: number, fub: number) =>
  (bolts * boltTensionResistance({ Ab: shank(d), fub })) / 1000;
const SHEAR = '13.12.1.1';
const TENSION = '13.12.1.2';

const bolts: readonly Check[] = [
  same(
    'S-C10-shear',
    SHEAR,
    'example C10',
    '6 M20, fub 830, one plane, threads in it',
    printed('526'),
    'kN',
    () => shear(6, 1, 20, 830),
  ),
  same(
    'S-M20-shear',
    SHEAR,
    'unit values',
    'M20, fub 830, one plane, threads out of it',
    printed('125'),
    'kN',
    () => shear(1, 1, 20, 830, false),
  ),
  {
    ...same(
      'S-C30-shear',
      SHEAR,
      'example C30',
      'M20, fub 830, one plane, threads in it',
      printed('87.5'),
      'kN',
      () => shear(1, 1, 20, 830),
    ),
    roundedFirst: rounding(
      'strength without threads, 0.60 φ A f',
      125,
      (0.6 * 0.8 * 100 * Math.PI * 830) / 1000,
    ),
  },
  same(
    'S-A325-shear',
    SHEAR,
    'examples T15, T20',
    '3/4 in bolt, fub 825, one plane, threads in it',
    printed('79.0'),
    'kN',
    () => shear(1, 1, 19.05, 825),
  ),
  same(
    'S-T15-shear',
    SHEAR,
    'example T15',
    '8 bolts 3/4 in, fub 825, one plane, threads in it',
    printed('632.1'),
    'kN',
    () => shear(8, 1, 19.05, 825),
  ),
  same(
    'S-T30-shear',
    SHEAR,
    'example T30',
    '6 bolts 3/4 in, fub 825, two planes, threads in them',
    printed('948.1'),
    'kN',
    () => shear(6, 2, 19.05, 825),
  ),
  same(
    'S-CPS2-shear',
    SHEAR,
    'problem set, question 2',
    '6 M20, fub 830, two planes, threads in them',
    printed('1051'),
    'kN',
    () => shear(6, 2, 20, 830),
  ),
  same(
    'S-C50-shear',
    SHEAR,
    'example C50',
    '4 M22, fub 830, one plane, threads in it',
    printed('424'),
    'kN',
    () => shear(4, 1, 22, 830),
  ),
  same('S-C50-tension', TENSION, 'example C50', '4 M22, fub 830', printed('757'), 'kN', () =>
    tension(4, 22, 830),
  ),
  same('S-CPS1-tension', TENSION, 'problem set, question 1', '4 M20, fub 830', printed('625.8'), 'kN', () =>
    tension(4, 20, 830),
  ),
];

const yields: readonly Check[] = (
  [
    ['C10', 'example C10', 'plate 140 × 10, fy 350', 1400, 350, printed('441')],
    ['T30-lap', 'example T30', 'two plates 230 × 10, fy 350', 4600, 350, printed('1449')],
    ['T30-tongue', 'example T30', 'plate 280 × 20, fy 350', 5600, 350, printed('1764')],
    ['T04', 'example T-4', 'plate 150 × 16, fy 350', 2400, 350, printed('756')],
    ['T07', 'example T-7', 'channel 2840 mm², fy 300', 2840, 300, printed('767')],
    ['T11', 'example T-11', 'bar 120 × 16, fy 300', 1920, 300, printed('518')],
    ['T15', 'example T15', 'angle 3390 mm², fy 350', 3390, 350, printed('1068')],
    ['CPS2', 'problem set, question 2', 'angle 3710 mm², fy 300', 3710, 300, printed('1002')],
    ['CPS4', 'problem set, question 4', 'angle 3580 mm², fy 300', 3580, 300, printed('967')],
    ['CPS1', 'problem set, question 1', 'tube 8230 mm², fy 300', 8230, 300, threeFigures(2220)],
  ] as const
).map(([id, example, inputs, area, fy, published]) =>
  same(`S-${id}-yield`, '13.2(a)(i)', example, inputs, published, 'kN', () => grossYield(area, fy) / 1000),
);

const weld = (z: number, degrees: number, length: number) =>
  (filletWeldMetal({ z, Xu: 490, thetaW: (degrees * Math.PI) / 180 }) * length) / 1000;
const METAL = '13.13.2.2(b)';
const welds: readonly Check[] = [
  same('S-W6-along', METAL, 'example C40', 'leg 6, Xu 490, along', printed('0.933'), 'kN/mm', () =>
    weld(6, 0, 1),
  ),
  same('S-C40-inclined', METAL, 'example C40', 'leg 6, Xu 490, 253 mm at 18.4°', printed('257'), 'kN', () =>
    weld(6, 18.4, 253),
  ),
  same(
    'S-CPS4-across',
    METAL,
    'problem set, question 4',
    'leg 8, Xu 490, 152 mm across',
    printed('283.7'),
    'kN',
    () => weld(8, 90, 152),
  ),
  {
    ...same(
      'S-W6-480',
      METAL,
      '',
      'leg 6, Xu 480, along',
      printed('0.914'),
      'kN/mm',
      () => filletWeldMetal({ z: 6, Xu: 480, thetaW: 0 }) / 1000,
    ),
    source: 'value often quoted for a 6 mm fillet with Xu 480',
    evidence: 'from memory',
    weak: 'no print of it was seen',
  },
];

const { detailing } = sans;
const limits: readonly Check[] = [
  same('S-C10-pitch', '22.3.1', 'example C10', 'M20', printed('54'), 'mm', () =>
    detailing.leastPitch(20, 22),
  ),
  same('S-C10-edge', '22.3.2, Table 6', 'example C10', 'M20, sheared edge', printed('34'), 'mm', () =>
    leastEdgeDistance(20, 'sheared'),
  ),
  same('S-C10-greatest-edge', '22.3.3', 'example C10', 't 10', printed('120'), 'mm', () =>
    detailing.greatestEdge(10, true),
  ),
  same('S-fillet-14', 'welding practice', 'least fillets', 'thicker part 14', printed('6'), 'mm', () =>
    leastFilletLeg(14),
  ),
  same('S-fillet-30', 'welding practice', 'least fillets', 'thicker part 30', printed('8'), 'mm', () =>
    leastFilletLeg(30),
  ),
];

export const sansSameExpression: readonly Check[] = [...bolts, ...yields, ...welds, ...limits];
