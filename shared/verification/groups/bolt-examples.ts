import { BOLT_CURVE_METRIC, boltForceRatio } from '../../engine/groups/bolt-curve.ts';
import { boltGroup, boltPattern } from '../../engine/groups/bolt-group.ts';
import { elasticBoltForces, elasticBoltMultiplier } from '../../engine/groups/bolt-group-elastic.ts';
import { type Check, printed, rounding } from '../check.ts';
import { type Bolts, coefficient, inOneLine, inTwoLines, printedCoefficient, solve } from './bolt-tables.ts';

type Line = readonly [
  id: string,
  place: string,
  inputs: string,
  text: string,
  unit: string,
  ours: () => number,
];

const companion = 'Companion to the AISC Steel Construction Manual, Vol. 1: Design Examples, Version 16.0';
const american = ([id, place, inputs, text, unit, ours]: Line): Check => ({
  id,
  basis: 'aisc-360-2022-lrfd',
  clause: 'Manual Part 7, instantaneous centre',
  source: `${companion}, Example ${place}`,
  evidence: 'found in text',
  inputs,
  published: printed(text),
  unit,
  ours,
});
const canadian = ([id, place, inputs, text, unit, ours]: Line): Check => ({
  ...american([id, place, inputs, text, unit, ours]),
  basis: 'csa-s16-2019',
  clause: 'CISC Handbook Part 3, instantaneous centre',
  source: `N. Holtz, CIVE 3205, Carleton University, to CSA S16-14 and the CISC Handbook, 11th ed., ${place}`,
});

/** A table's entry as it is printed. */
const entry = (bolts: Bolts, ex: number): number => printedCoefficient(coefficient(bolts, ex)).place;
const read = (bolts: Bolts, ex: number): number =>
  Math.round(coefficient(bolts, ex) / entry(bolts, ex)) * entry(bolts, ex);
/** What a reader finds between two entries of a table, `share` of the way from one to the next. */
const between = (bolts: Bolts, ex: number, next: number, share: number): number =>
  read(bolts, ex) + share * (read(bolts, next) - read(bolts, ex));

const twoOfSix: Bolts = { n: 6, lines: 2, pitch: 3, gauge: 5.5 };
const companionLines: readonly Line[] = [
  [
    'IC-A24A',
    'II.A-24 A',
    'two lines of six at 3 × 5.5 in, e_x 16 in',
    '3.55',
    '',
    () => coefficient(twoOfSix, 16),
  ],
  [
    'IC-A24B',
    'II.A-24 B',
    'the same, e_x 14 in, load at 15°',
    '4.05',
    '',
    () => coefficient(twoOfSix, 14, 15),
  ],
  ['IC-A28A', 'II.A-28A', 'four bolts at 3 in, e_x 2.5 in', '3.07', '', () => coefficient(inOneLine(4), 2.5)],
  [
    'IC-A17A',
    'II.A-17A',
    'four bolts at 3 in, between e_x 1 and 2 in',
    '3.54',
    '',
    () => between(inOneLine(4), 1, 2, 0.5),
  ],
  [
    'IC-A19A',
    'II.A-19A',
    'two lines of four at 3 in, a quarter from e_x 10 to 12 in',
    '2.33',
    '',
    () => between(inTwoLines(4), 10, 12, 0.25),
  ],
];

const C60: Bolts = { n: 3, lines: 2, pitch: 80, gauge: 80 };
const eccent: Bolts = { n: 6, lines: 1, pitch: 75, gauge: 0 };
/** A force of 1 along the lines, e from their middle. */
const beside = (e: number) => ({ fx: 0, fy: 1, moment: e });
const forceC60 = (bolt: number): number => {
  const { forces } = solve(C60, beside(200));
  return 329 * Math.hypot(forces[2 * bolt]!, forces[2 * bolt + 1]!);
};
const solveEccent = () => solve(eccent, beside(300), { curve: BOLT_CURVE_METRIC });
const forceEccent = (bolt: number): number => {
  const { forces } = solveEccent();
  return 282 * Math.hypot(forces[2 * bolt]!, forces[2 * bolt + 1]!);
};
const inC60 = 'two lines of three at 80 × 80 mm, e 200 mm, R_ult 329 kN';
const inEccent = 'six bolts at 75 mm, e 300 mm, R_ult 282 kN';
const canadianLines: readonly Line[] = [
  [
    'IC-C60',
    'Example C60, program listing',
    inC60,
    '616.7',
    'kN',
    () => 329 * solve(C60, beside(200)).multiplier,
  ],
  [
    'IC-C60-r0',
    'Example C60',
    `${inC60}: from the middle to the centre`,
    '35.7',
    'mm',
    () => -(solve(C60, beside(200)).centre?.x ?? NaN),
  ],
  ['IC-C60-R1', 'Example C60', `${inC60}: near line, outer bolt`, '313', 'kN', () => forceC60(0)],
  ['IC-C60-R2', 'Example C60', `${inC60}: near line, middle bolt`, '105', 'kN', () => forceC60(1)],
  ['IC-C60-R4', 'Example C60', `${inC60}: far line, outer bolt`, '323', 'kN', () => forceC60(3)],
  ['IC-C60-R5', 'Example C60', `${inC60}: far line, middle bolt`, '311', 'kN', () => forceC60(4)],
  ['IC-ECC1', 'Example ECCENT-1', inEccent, '567', 'kN', () => 282 * solveEccent().multiplier],
  ['IC-ECC1-R1', 'Example ECCENT-1', `${inEccent}: outermost bolt`, '277.1', 'kN', () => forceEccent(0)],
  ['IC-ECC1-R2', 'Example ECCENT-1', `${inEccent}: the next`, '263.2', 'kN', () => forceEccent(1)],
  [
    'IC-ECC1-curve',
    'Example ECCENT-1',
    'R_ult 282 kN, Δ 5.848 mm',
    '266.7',
    'kN',
    () => 282 * boltForceRatio(5.848 / 8.64, BOLT_CURVE_METRIC),
  ],
];

const cisc: Check = {
  ...canadian([
    'IC-CISC',
    '',
    'two lines of three at 80 × 80 mm, e 200 mm',
    '1.91',
    '',
    () => solve(C60, beside(200), { normalise: 'atMaximum' }).multiplier,
  ]),
  source:
    'CISC Handbook of Steel Construction, Tables 3-14 to 3-20 (a multiple of the force at the greatest deformation)',
};

const elasticGroup = boltGroup(boltPattern(6, 2, 3, 5.5));
const elasticShare = () => elasticBoltMultiplier(elasticGroup, beside(16));
/** By hand: √((16 · 7.5/405.75)² + (1/12 + 16 · 2.75/405.75)²) = √(0.29575² + 0.19178²) = 0.35248. */
const chain = rounding('the critical bolt for a load of 1', 0.352, 0.35248);
const inElastic = 'two lines of six at 3 × 5.5 in, e_x 16 in';
const elastic: readonly Check[] = [
  american(['EL-IIA25-Ip', 'II.A-25', inElastic, '406', 'in²', () => elasticGroup.polar]),
  {
    ...american(['EL-IIA25', 'II.A-25', inElastic, '0.352', '1/P', () => 1 / elasticShare()]),
    roundedFirst: rounding('I_p', 406, 405.75),
  },
  {
    ...american([
      'EL-IIA25-LRFD',
      'II.A-25',
      `${inElastic}, φr_n 24.3 kips`,
      '69.0',
      'kips',
      () => 24.3 * elasticShare(),
    ]),
    roundedFirst: chain,
  },
  {
    ...american([
      'EL-IIA25-ASD',
      'II.A-25',
      `${inElastic}, r_n/Ω 16.2 kips`,
      '46.0',
      'kips',
      () => 16.2 * elasticShare(),
    ]),
    basis: 'aisc-360-2022-asd' as const,
    roundedFirst: chain,
  },
].map((check) => ({ ...check, clause: 'Manual Part 7, elastic method' }));

/** The part across the line of the force on the outer of three bolts. */
function outerAcross(): number {
  const forces = new Float64Array(6);
  elasticBoltForces(boltGroup(boltPattern(3, 1, 100, 0)), { fx: 0, fy: 500, moment: 500 * 50 }, forces);
  return Math.abs(forces[0]!);
}
const european: Check = {
  id: 'GRP-03',
  basis: 'en-1993-1-8-2005',
  clause: '3.12',
  source: 'thestructuralengineer.info, calculation example of a shear bolt connection to EC3',
  evidence: 'found in text',
  inputs: 'V 500 kN at 50 mm from a line of three bolts at 100 mm: the outer bolt, across the line',
  published: printed('125'),
  unit: 'kN',
  ours: outerAcross,
};

/** Eccentric bolt groups in published worked examples. */
export const boltExamples: readonly Check[] = [
  ...companionLines.map(american),
  ...canadianLines.map(canadian),
  cisc,
  ...elastic,
  european,
];
