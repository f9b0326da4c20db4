import {
  bearingResistance,
  blockTearing,
  boltShearResistance,
  boltTensionResistance,
  filletBaseMetal,
  filletWeldMetal,
  longJointFactor,
  netSectionResistance,
  oneLegFactor,
  shearTensionUtilisation,
} from '../../engine/standards/sans-10162-1-2011/index.ts';
import { type Check, printed } from '../check.ts';

/*
 * Formulas of SANS 10162-1:2011 (from memory) worked out by hand, rounded to three figures. No print was seen, so
 * they guard against change and are no evidence from outside.
 */
function evaluated(
  id: string,
  clause: string,
  inputs: string,
  text: string,
  unit: string,
  ours: () => number,
): Check {
  return {
    id: `SR-${id}`,
    basis: 'sans-10162-1-2011',
    clause,
    source: 'formula of the clause, worked by hand',
    evidence: 'rule evaluation',
    inputs,
    published: printed(text),
    unit,
    ours,
  };
}

const shank = (d: number) => (Math.PI * d * d) / 4;
const shear = (d: number, fub: number, threadsIntercepted: boolean) =>
  boltShearResistance({ m: 1, Ab: shank(d), fub, threadsIntercepted }) / 1000;

/** d, f_ub, then shear with the threads out of the plane, in it, and tension, kN. */
const boltRows = [
  [16, 830, '80.1', '56.1', '100'],
  [20, 830, '125', '87.6', '156'],
  [22, 830, '151', '106', '189'],
  [24, 830, '180', '126', '225'],
  [27, 830, '228', '160', '285'],
  [30, 830, '282', '197', '352'],
  [36, 830, '406', '284', '507'],
  [20, 420, '63.3', '44.3', '79.2'],
] as const;
const bolts = boltRows.flatMap(([d, fub, out, inPlane, pull]) => [
  evaluated(`M${d}-${fub}-out`, '13.12.1.1', `0.60 × 0.80 A_b ${fub}, d ${d}`, out, 'kN', () =>
    shear(d, fub, false),
  ),
  evaluated(`M${d}-${fub}-in`, '13.12.1.1', `0.60 × 0.80 × 0.70 A_b ${fub}, d ${d}`, inPlane, 'kN', () =>
    shear(d, fub, true),
  ),
  evaluated(
    `M${d}-${fub}-tension`,
    '13.12.1.2',
    `0.75 × 0.80 A_b ${fub}, d ${d}`,
    pull,
    'kN',
    () => boltTensionResistance({ Ab: shank(d), fub }) / 1000,
  ),
]);

const welds = (
  [
    [5, '0.762'],
    [6, '0.914'],
    [8, '1.22'],
    [10, '1.52'],
    [12, '1.83'],
  ] as const
).map(([z, text]) =>
  evaluated(
    `W${z}`,
    '13.13.2.2(b)',
    `0.67 × 0.67 × 0.7071 × ${z} × 480, along`,
    text,
    'kN/mm',
    () => filletWeldMetal({ z, Xu: 480, thetaW: 0 }) / 1000,
  ),
);

const others: readonly Check[] = [
  evaluated(
    'WB6',
    '13.13.2.2(a)',
    '0.67 × 0.67 × 6 × 450',
    '1.21',
    'kN/mm',
    () => filletBaseMetal({ z: 6, fu: 450 }) / 1000,
  ),
  evaluated(
    'bearing',
    '13.10',
    '3 × 0.67 × 10 × 20 × 450',
    '181',
    'kN',
    () => bearingResistance(10, 20, 450, Infinity) / 1000,
  ),
  evaluated(
    'bearing-end',
    '13.10',
    '0.67 × 35 × 10 × 450, end distance 35',
    '106',
    'kN',
    () => bearingResistance(10, 20, 450, 35) / 1000,
  ),
  evaluated('long-joint', '13.12.1.1', '1.075 − 0.005 × 450/20', '0.9625', '', () =>
    longJointFactor(450, 20),
  ),
  evaluated('long-joint-least', '13.12.1.1', '1.075 − 0.005 × 1600/20 is 0.675; least 0.75', '0.75', '', () =>
    longJointFactor(1600, 20),
  ),
  evaluated(
    'block-net',
    '13.11',
    '0.9 × 360 × 450 + 0.54 min(1800 × 350, 1200 × 450)',
    '437.4',
    'kN',
    () => blockTearing(360, 1800, 1200, 350, 450) / 1000,
  ),
  evaluated(
    'block-gross',
    '13.11',
    '0.9 × 640 × 450 + 0.54 min(1800 × 350, 1500 × 450)',
    '599.4',
    'kN',
    () => blockTearing(640, 1800, 1500, 350, 450) / 1000,
  ),
  evaluated(
    'net',
    '13.2(a)(ii)',
    '0.85 × 0.9 × 0.60 × 2780 × 480, three rows by one leg',
    '612.5',
    'kN',
    () => netSectionResistance(oneLegFactor(3) * 2780, 480) / 1000,
  ),
  evaluated(
    'net-4',
    '12.3.3.2',
    '0.85 × 0.9 × 0.80 × 2780 × 480, four rows by one leg',
    '816.7',
    'kN',
    () => netSectionResistance(oneLegFactor(4) * 2780, 480) / 1000,
  ),
  evaluated(
    'shear-tension',
    '13.12.1.3',
    'V 60 of 87.6, T 112 of 156.5: the line, (60/87.6 + 112/156.5)/1.4',
    '1.000',
    '',
    () => shearTensionUtilisation({ V: 60, Vr: 87.6, T: 112, Tr: 156.5 }),
  ),
];

export const sansRuleEvaluations: readonly Check[] = [...bolts, ...welds, ...others];
