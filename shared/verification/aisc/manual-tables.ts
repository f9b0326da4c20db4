import * as aisc from '../../engine/standards/aisc-360-2022/index.ts';
import { rounding } from '../check.ts';
import { COMPANION, MANUAL, Rows } from './formats.ts';

/** Kips, inches and ksi throughout: the clause functions take any set of units that belongs together. */
const { rupture, yielding } = aisc;
const shank = (d: number) => (Math.PI * d * d) / 4;

const bolts = new Rows('7-1');
/** d, F_nv, design, allowable, read. Manual Table 7-1, single shear. */
const shear = [
  [0.75, 54, '17.9', '11.9', true],
  [0.75, 68, '22.5', '15.0', false],
  [0.75, 84, '27.8', '18.6', false],
  [0.875, 54, '24.3', '16.2', true],
  [0.875, 68, '30.7', '20.4', false],
  [0.875, 84, '37.9', '25.3', false],
  [1, 54, '31.8', '21.2', false],
  [1, 68, '40.0', '26.7', false],
  [1, 84, '49.5', '33.0', false],
] as const;
/** A_b as the Manual prints it, in.2 */
const roundedArea = {
  0.75: rounding('A_b', 0.442, 0.44179),
  0.875: rounding('A_b', 0.601, 0.60132),
  1: rounding('A_b', 0.785, 0.785398),
} as const;
for (const [d, Fnv, design, allowable, read] of shear) {
  const given = {
    state: 'bolt shear',
    clause: 'J3.7',
    source: `${MANUAL}, Table 7-1`,
    inputs: `d ${d} in., F_nv ${Fnv} ksi, one plane`,
    unit: 'kip',
    memory: !read,
  };
  bolts.both(
    given,
    rupture,
    design,
    allowable,
    () => aisc.nominalBoltShear({ Fnv, Ab: shank(d), planes: 1 }),
    { lrfd: roundedArea[d] },
  );
}

const pulls = new Rows('7-2');
/** d, F_nt, design, allowable, read. Manual Table 7-2. */
const tension = [
  [0.75, 90, '29.8', '19.9', true],
  [0.75, 113, '37.4', '25.0', false],
  [0.875, 90, '40.6', '27.1', true],
  [0.875, 113, '51.0', '34.0', false],
  [1, 90, '53.0', '35.3', false],
  [1, 113, '66.6', '44.4', false],
] as const;
for (const [d, Fnt, design, allowable, read] of tension) {
  const given = {
    state: 'bolt tension',
    clause: 'J3.7',
    source: `${MANUAL}, Table 7-2`,
    inputs: `d ${d} in., F_nt ${Fnt} ksi`,
    unit: 'kip',
    memory: !read,
  };
  pulls.both(given, rupture, design, allowable, () => aisc.nominalBoltTension({ Fnt, Ab: shank(d) }));
}

const holes = new Rows('7-4');
/** d, hole, end, pitch, F_u, design, allowable, read. Manual Tables 7-4 and 7-5, per inch of thickness. */
const bearing = [
  [0.75, 0.8125, Infinity, 3, 65, '87.8', '58.5', true],
  [0.75, 0.8125, 1.25, Infinity, 65, '49.4', '32.9', true],
  [0.75, 0.8125, 1.5, Infinity, 65, '64.0', '42.7', true],
  [0.75, 0.8125, 2, Infinity, 65, '87.8', '58.5', true],
  [0.75, 0.8125, Infinity, 3, 58, '78.3', '52.2', false],
  [0.75, 0.8125, 1.25, Infinity, 58, '44.0', '29.4', false],
  [0.875, 0.9375, Infinity, 3, 58, '91.4', '60.9', false],
  [0.875, 0.9375, Infinity, 3, 65, '102', '68.3', false],
  [0.875, 0.9375, 1.25, Infinity, 65, '45.7', '30.5', false],
] as const;
for (const [d, dh, end, pitch, Fu, design, allowable, read] of bearing) {
  const place = end === Infinity ? `s ${pitch} in.` : `l_e ${end} in.`;
  const given = {
    state: 'bearing and tear-out',
    clause: 'J3.11a',
    source: `${MANUAL}, Tables 7-4 and 7-5`,
    inputs: `d ${d} in., hole ${dh} in., ${place}, F_u ${Fu} ksi, per inch`,
    unit: 'kip/in.',
    memory: !read,
  };
  holes.both(given, rupture, design, allowable, () =>
    Math.min(
      aisc.nominalBearing(d, 1, Fu, true),
      aisc.nominalTearOut(aisc.clearDistance(end, pitch, dh), 1, Fu, true),
    ),
  );
}

const welds = new Rows('8-2');
const sixteenth = {
  state: 'fillet along',
  clause: 'J2.4(a)',
  source: `${COMPANION}, Manual Equation 8-2`,
  inputs: 'E70, 1/16 in. of leg',
  unit: 'kip/in.',
};
welds.both(sixteenth, rupture, '1.392', '0.928', () => aisc.nominalFillet({ w: 1 / 16, FEXX: 70, kds: 1 }));
/** Sixteenths of leg, fillets, F_u, printed thickness. Manual Equations 9-6 and 9-7. */
for (const [D, fillets, Fu, printed] of [
  [3, 1, 65, '0.143'],
  [4, 2, 65, '0.381'],
  [5, 1, 65, '0.238'],
  [5, 2, 65, '0.476'],
] as const) {
  const given = {
    state: 'base metal as strong as the fillet',
    clause: 'J2.4, J4.2(b)',
    source: `${COMPANION}, Manual Equations 9-6 and 9-7`,
    inputs: `E70, leg ${D}/16 in., ${fillets} fillet${fillets > 1 ? 's' : ''}, F_u ${Fu} ksi`,
    unit: 'in.',
  };
  welds.value(given, printed, () => aisc.matchingThickness({ w: D / 16, FEXX: 70, Fu, fillets }));
}

const blocks = new Rows('9-3');
const block = {
  clause: 'J4.2, J4.3',
  source: `${COMPANION}, Examples II.A-28A and II.A-30, Manual Tables 9-3`,
  inputs: '4 3/4 in. bolts, s 3, l_ev 1.25, l_eh 1.25, F_y 50, F_u 65',
};
const Ant = 1.25 - 0.5 * 0.875;
const Agv = 9 + 1.25;
const Anv = Agv - 3.5 * 0.875;
const perInch = (state: string) => ({ ...block, state, unit: 'kip/in.' });
blocks.both(perInch('tension rupture of the block'), rupture, '39.6', '26.4', () =>
  aisc.nominalTensileRupture(65, Ant),
);
const shearYieldOfBlock = perInch('shear yield of the block');
blocks.both(shearYieldOfBlock, rupture, '231', '154', () => aisc.nominalShearYield(50, Agv));
const shearRuptureOfBlock = perInch('shear rupture of the block');
blocks.both(shearRuptureOfBlock, rupture, '210', '140', () => aisc.nominalShearRupture(65, Anv));
for (const [t, design, allowable] of [
  [0.375, '93.6', '62.4'],
  [0.35, '87.4', '58.2'],
] as const) {
  const given = {
    ...block,
    state: 'block shear',
    inputs: `${block.inputs}, t ${t}`,
    unit: 'kip',
  };
  blocks.both(
    given,
    rupture,
    design,
    allowable,
    () => aisc.nominalBlockShear(t * Ant, t * Agv, t * Anv, 50, 65, 1),
    { lrfd: rounding('sum per inch', 249.6, 249.843), asd: rounding('sum per inch', 166.4, 166.562) },
  );
}

const columns = new Rows('4-14');
/** 1 ksi in MPa: the critical stress knows E in MPa. */
const KSI = 6.894757;
/** L_c/r, design, allowable; F_y 50 ksi. */
for (const [slenderness, design, allowable] of [
  [50, '37.5', '24.9'],
  [100, '21.7', '14.4'],
  [150, '10.0', '6.68'],
] as const) {
  const given = {
    state: 'compression',
    clause: 'E3',
    source: `${MANUAL}, Table 4-14 (available critical stress)`,
    inputs: `F_y 50 ksi, L_c/r ${slenderness}`,
    unit: 'ksi',
    memory: true,
  };
  columns.both(given, yielding, design, allowable, () => aisc.criticalStress(50 * KSI, slenderness) / KSI);
}

/** Values of the Manual's tables. */
export const manualTables = [bolts, pulls, holes, welds, blocks, columns].flatMap(({ list }) => list);
