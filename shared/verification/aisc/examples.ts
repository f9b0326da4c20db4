import * as aisc from '../../engine/standards/aisc-360-2022/index.ts';
import { type Check, type Disagreement, rounding } from '../check.ts';
import { COMPANION, Rows } from './formats.ts';

/** Kips, inches and ksi throughout: the clause functions take any set of units that belongs together. */
const { asd, lrfd, rupture, shearYielding, yielding } = aisc;

const j1 = new Rows('j1');
const longWeld = {
  source: `${COMPANION}, Example J.1`,
  inputs: 'E70, leg 3/16 in., two fillets of 27 in., F_u 65, base 0.25 in.',
  clause: 'J2.4(a), J2.2b(d)',
};
const perInch = aisc.nominalFillet({ w: 3 / 16, FEXX: 70, kds: 1 });
j1.value({ ...longWeld, state: 'fillet along, nominal', unit: 'kip/in.' }, '5.57', () => perInch);
j1.value({ ...longWeld, state: 'long end-loaded fillet', unit: '' }, '0.912', () =>
  aisc.endLoadedFactor(27, 3 / 16),
);
j1.both(
  { ...longWeld, state: 'fillets along', unit: 'kip' },
  rupture,
  '206',
  '137',
  () => perInch * 2 * 27 * aisc.endLoadedFactor(27, 3 / 16),
);
const baseMetal = { ...longWeld, state: 'base metal in shear rupture', clause: 'J4.2(b)', unit: 'kip' };
j1.both(baseMetal, rupture, '395', '264', () => aisc.nominalShearRupture(65, 0.25 * 2 * 27), {
  asd: rounding('R_n', 527, 526.5),
});

const j2 = new Rows('j2a');
const inclined = {
  source: `${COMPANION}, Example J.2A`,
  inputs: 'E70, leg 5/16 in., both sides, load at 60°',
  clause: 'J2.4(a)',
};
const kds = aisc.directionalIncrease(Math.sin(Math.PI / 3));
j2.value({ ...inclined, state: 'directional increase', unit: '' }, '1.40', () => kds);
j2.value({ ...inclined, state: 'fillet inclined, nominal', unit: 'kip/in.' }, '13.0', () =>
  aisc.nominalFillet({ w: 5 / 16, FEXX: 70, kds }),
);
j2.both(
  { ...inclined, state: 'fillets inclined', unit: 'kip/in.' },
  rupture,
  '19.5',
  '13.0',
  () => 2 * aisc.nominalFillet({ w: 5 / 16, FEXX: 70, kds }),
);

const j3 = new Rows('j3');
const combined = {
  source: `${COMPANION}, Example J.3`,
  inputs: '3/4 in. Group 120-N, A_b 0.442, V 7.996 (LRFD), 5.33 (ASD)',
  clause: 'J3.8',
};
const stress = (format: aisc.Format, V: number) =>
  aisc.tensileStressWithShear(format, { Fnt: 90, Fnv: 54, frv: V / 0.442 });
const design = () => stress(lrfd, 1.2 * 1.33 + 1.6 * 4);
const allowable = () => stress(asd, 1.33 + 4);
const reduced = { ...combined, state: 'bolt tension with shear, stress', unit: 'ksi' };
j3.add(reduced, 'aisc-360-2022-lrfd', '76.8', design);
j3.add(reduced, 'aisc-360-2022-asd', '76.7', allowable, rounding("F'_nt with f_rv as 12.1", 76.667, 76.804));
const withShear = { ...combined, state: 'bolt tension with shear', unit: 'kip' };
j3.add(withShear, 'aisc-360-2022-lrfd', '25.5', () => aisc.available(lrfd, 0.442 * design(), rupture));
j3.add(withShear, 'aisc-360-2022-asd', '17.0', () => aisc.available(asd, 0.442 * allowable(), rupture));

const a1 = new Rows('iia1a');
const cleat = {
  source: `${COMPANION}, Example II.A-1A`,
  inputs: '2L5x3.5x5/16, 8 rows of 3/4 in. Group 120-N, s 3, l_ev 1.25, F_y 50, F_u 65',
};
const of = (state: string, clause: string) => ({ ...cleat, state, clause, unit: 'kip' });
const t = 5 / 16;
const bolt = aisc.nominalBoltShear({ Fnv: 54, Ab: (Math.PI * 0.75 * 0.75) / 4, planes: 1 });
const edge = aisc.nominalTearOut(aisc.clearDistance(1.25, Infinity, 13 / 16), t, 65, true);
const inner = aisc.nominalTearOut(aisc.clearDistance(Infinity, 3, 13 / 16), t, 65, true);
a1.both(of('shear yield', 'J4.2(a)'), shearYielding, '441', '294', () =>
  aisc.nominalShearYield(50, 2 * 23.5 * t),
);
a1.both(of('shear rupture', 'J4.2(b)'), rupture, '302', '201', () =>
  aisc.nominalShearRupture(65, 2 * (23.5 - 8 * 0.875) * t),
);
a1.both(of('block shear', 'J4.3'), rupture, '315', '210', () =>
  aisc.nominalBlockShear(0.586, 13.9, 9.8, 50, 65, 1),
);
a1.both(of('bearing', 'J3.11a'), rupture, '27.5', '18.3', () => aisc.nominalBearing(0.75, t, 65, true), {
  lrfd: rounding('R_n', 36.6, 36.5625),
});
a1.both(of('tear-out at the end', 'J3.11a'), rupture, '15.5', '10.3', () => edge, {
  lrfd: rounding('R_n', 20.6, 20.5664),
});
a1.both(of('tear-out between holes', 'J3.11a'), rupture, '40.1', '26.7', () => inner, {
  lrfd: rounding('R_n', 53.4, 53.3203),
});
a1.both(of('bolt group, bolt by bolt', 'J3.7'), rupture, '282', '187', () => 14 * bolt + 2 * edge, {
  lrfd: rounding('14 × 17.9 + 2 × 15.5', 281.6, 281.343),
  asd: rounding('14 × 11.9 + 2 × 10.3', 187.2, 187.562),
});

const a11 = new Rows('iia11a');
const endPlate = {
  source: `${COMPANION}, Example II.A-11A`,
  inputs: 'PL 1/4 x 8.5, 3 rows of 2 3/4 in. Group 120-N, F_y 50, F_u 65',
};
const plate = (state: string, clause: string) => ({ ...endPlate, state, clause, unit: 'kip' });
a11.both(
  plate('shear yield', 'J4.2(a)'),
  shearYielding,
  '128',
  '85.3',
  () => aisc.nominalShearYield(50, 2 * 8.5 * 0.25),
  { asd: rounding('φR_n, from which R_n/Ω was taken', 128, 127.5) },
);
a11.both(
  plate('shear rupture', 'J4.2(b)'),
  rupture,
  '86.3',
  '57.5',
  () => aisc.nominalShearRupture(65, 2 * (8.5 - 3 * 0.875) * 0.25),
  {
    lrfd: rounding('R_n', 115, 114.5625),
    asd: rounding('R_n', 115, 114.5625),
  },
);
a11.both(
  plate('block shear', 'J4.3'),
  rupture,
  '93.8',
  '62.5',
  () => aisc.nominalBlockShear(0.40625, 3.625, 2.53125, 50, 65, 1),
  { asd: rounding('R_n', 125, 125.125) },
);

const a19 = new Rows('iia19a');
const extended = {
  source: `${COMPANION}, Example II.A-19A`,
  inputs: 'PL 1/2 x 12, 2 lines of 4 3/4 in. bolts, F_y 50, F_u 65',
  state: 'block shear of a beam end with two lines',
  clause: 'J4.3',
  unit: 'kip',
};
a19.both(
  extended,
  rupture,
  '145',
  '96.5',
  () => aisc.nominalBlockShear(1.46875, 5.25, 3.71875, 50, 65, aisc.uniformity['coped-two-lines']),
  { asd: rounding('R_n', 193, 192.766) },
);

const d1 = new Rows('iid1');
const hanger = {
  source: `${COMPANION}, Example II.D-1`,
  inputs: '2L3x3x5/16, x 0.860, WT6x17.5 stem 0.300',
};
d1.value({ ...hanger, state: 'stem block shear, nominal', clause: 'J4.3', unit: 'kip' }, '131', () =>
  aisc.nominalBlockShear(3 * 0.3, 2 * 4 * 0.3, 2 * 4 * 0.3, 50, 65, 1),
);
const angles = { ...hanger, state: 'angle yield', clause: 'J4.1(a)', unit: 'kip' };
d1.both(angles, yielding, '160', '107', () => aisc.nominalTensileYield(50, 3.56));
const truss = new Rows('truss');
const flanges = {
  source: 'Educational calculation page of AISC, wide-flange truss (15th ed. Manual)',
  inputs: 'W12x72, 16 1 1/8 in. A490-N, holes 1.25, s 4, edge 2, F_y 50, F_u 65',
};
const one = (state: string, clause: string, unit = 'kip') => ({ ...flanges, state, clause, unit });
truss.value(one('shear lag', 'Table D3.1, case 2', ''), '0.915', () => aisc.shearLagFactor(1.02, 12, 0));
truss.both(one('tension yield', 'D2(a)'), yielding, '950', null, () => aisc.nominalTensileYield(50, 21.1));
truss.both(one('tension rupture', 'D2(b)'), rupture, '784', null, () =>
  aisc.nominalTensileRupture(65, 17.58 * aisc.shearLagFactor(1.02, 12, 0)),
);
truss.both(one('block shear', 'J4.3'), rupture, '1080', null, () =>
  aisc.nominalBlockShear(6.95, 37.5, 25.2, 50, 65, 1),
);
truss.value(one('bolt shear, nominal', 'J3.7'), '67.6', () =>
  aisc.nominalBoltShear({ Fnv: 68, Ab: (Math.PI * 1.125 * 1.125) / 4, planes: 1 }),
);
truss.value(one('bearing, nominal', 'J3.11a'), '117.6', () => aisc.nominalBearing(1.125, 0.67, 65, true));
truss.value(one('tear-out, nominal', 'J3.11a'), '71.9', () =>
  aisc.nominalTearOut(aisc.clearDistance(2, Infinity, 1.25), 0.67, 65, true),
);

/** Values of published worked examples. */
export const examples: readonly Check[] = [j1, j2, j3, a1, a11, a19, d1, truss].flatMap(({ list }) => list);

/** Printed values that their own rule does not give. */
export const exampleDisagreements: readonly Disagreement[] = [
  {
    id: 'aisc-iid1-whitmore-lrfd',
    published: '104 kip, Whitmore section of the stem, 3 + 2 × 4 tan 30° by 0.300 in., F_y 50',
    reason:
      'Two roundings in a chain in the publication (114.3 to 115 to 104); unrounded it is 102.9 kip, ours.',
  },
  {
    id: 'aisc-iid1-whitmore-asd',
    published: '68.9 kip, the same section',
    reason: 'The same chain (115 to 68.9); unrounded it is 68.4 kip, ours.',
  },
];
