import { BOLT_CURVE_METRIC } from '../../engine/groups/bolt-curve.ts';
import { boltGroup, boltPattern } from '../../engine/groups/bolt-group.ts';
import { elasticBoltMultiplier } from '../../engine/groups/bolt-group-elastic.ts';
import { boltGroupIc, type BoltIcOptions } from '../../engine/groups/bolt-group-ic.ts';
import type { Check, Evidence, Printed } from '../check.ts';
import { printed, rounding, threeFigures } from '../check.ts';
import { momentAlone, oneLine, twoLines } from './bolt-table-rows.ts';

/** Coefficient of `lines` of `n` bolts for a load at `degrees` from the lines, `ex` across them from the middle. */
function coefficient(
  n: number,
  lines: number,
  pitch: number,
  gauge: number,
  ex: number,
  degrees = 0,
  options: BoltIcOptions = {},
): number {
  const angle = (degrees * Math.PI) / 180;
  const load = { fx: Math.sin(angle), fy: Math.cos(angle), moment: ex * Math.cos(angle) };
  const found = boltGroupIc(boltGroup(boltPattern(n, lines, pitch, gauge)), load, options);
  if (!found.ok) throw new Error(found.reason);
  return found.multiplier;
}

function momentCoefficient(n: number): number {
  const found = boltGroupIc(boltGroup(boltPattern(n, 1, 3, 0)), { fx: 0, fy: 0, moment: 1 });
  if (!found.ok) throw new Error(found.reason);
  return found.multiplier;
}

const manual = 'AISC Steel Construction Manual, 13th to 16th editions';
const check = (
  id: string,
  table: string,
  evidence: Evidence,
  inputs: string,
  published: Printed,
  ours: () => number,
  unit = '',
): Check => ({
  id,
  basis: 'aisc-360-2022-lrfd',
  clause: 'Manual Part 7, instantaneous centre',
  source: `${manual}, ${table}`,
  evidence,
  inputs,
  published,
  unit,
  ours,
});

const tables: readonly Check[] = [
  ...oneLine.map(([ex, n, C]) =>
    check(
      `IC-76-${ex}-${n}`,
      'Table 7-6',
      'from memory',
      `${n} bolts at 3 in, e_x ${ex} in`,
      threeFigures(C),
      () => coefficient(n, 1, 3, 0, ex),
    ),
  ),
  ...twoLines.map(([ex, n, C]) =>
    check(
      `IC-77-${ex}-${n}`,
      'Table 7-7',
      'from memory',
      `two lines of ${n} bolts at 3 in, 3 in apart, e_x ${ex} in`,
      threeFigures(C),
      () => coefficient(n, 2, 3, 3, ex),
    ),
  ),
  ...momentAlone.map(([n, C]) =>
    check(
      `IC-76-M-${n}`,
      "Table 7-6, C'",
      'from memory',
      `${n} bolts at 3 in, moment alone`,
      threeFigures(C),
      () => momentCoefficient(n),
      'in',
    ),
  ),
];

const examples = 'Companion to the AISC Steel Construction Manual, Vol. 1: Design Examples, Version 16.0';
const read = (id: string, example: string, inputs: string, value: string, ours: () => number): Check => ({
  ...check(id, '', 'found in text', inputs, printed(value), ours),
  source: `${examples}, Example ${example}`,
});

const holtz = 'N. Holtz, CIVE 3205, Carleton University, to CSA S16-14 and the CISC Handbook, 11th ed.';
const canadian: readonly Check[] = [
  {
    ...check(
      'IC-C60',
      '',
      'found in text',
      'two lines of three at 80 × 80 mm, e 200 mm, R_ult 329 kN',
      printed('616'),
      () =>
        // μ = 0.394 per mm is 10 per inch.
        329 * coefficient(3, 2, 80, 80, 200),
    ),
    basis: 'csa-s16-2019',
    clause: 'CISC Handbook Part 3, instantaneous centre',
    source: `${holtz}, Example C60`,
    unit: 'kN',
    roundedFirst: rounding('the program listing prints 616.7 as 616 in the hand solution', 616, 616.7),
  },
  {
    ...check(
      'IC-ECC1',
      '',
      'found in text',
      'six bolts at 75 mm, e 300 mm, R_ult 282 kN',
      printed('567'),
      () => 282 * coefficient(6, 1, 75, 0, 300, 0, { curve: BOLT_CURVE_METRIC }),
    ),
    basis: 'csa-s16-2019',
    clause: 'CISC Handbook Part 3, instantaneous centre',
    source: `${holtz}, Example ECCENT-1`,
    unit: 'kN',
  },
  {
    ...check(
      'IC-CISC',
      '',
      'found in text',
      'two lines of three at 80 × 80 mm, e 200 mm',
      printed('1.91'),
      () => coefficient(3, 2, 80, 80, 200, 0, { normalise: 'atMaximum' }),
    ),
    basis: 'csa-s16-2019',
    clause: 'CISC Handbook Part 3, instantaneous centre',
    source:
      'CISC Handbook of Steel Construction, Tables 3-14 to 3-20 (a multiple of the force at the greatest deformation)',
  },
];

const elastic: Check = {
  ...check(
    'EL-IIA25',
    '',
    'found in text',
    'two lines of six at 3 × 5.5 in, e_x 16 in',
    printed('0.352'),
    () => {
      const group = boltGroup(boltPattern(6, 2, 3, 5.5));
      return 1 / elasticBoltMultiplier(group, { fx: 0, fy: 1, moment: 16 });
    },
  ),
  clause: 'Manual Part 7, elastic method',
  source: `${examples}, Example II.A-25`,
  unit: '1/P',
  roundedFirst: rounding('I_p', 406, 405.75),
};

/** Eccentric bolt groups against published tables and worked examples. */
export const boltTables: readonly Check[] = [
  ...tables,
  read('IC-A24A', 'II.A-24 A', 'two lines of six at 3 × 5.5 in, e_x 16 in', '3.55', () =>
    coefficient(6, 2, 3, 5.5, 16),
  ),
  read('IC-A24B', 'II.A-24 B', 'the same, e_x 14 in, load at 15°', '4.05', () =>
    coefficient(6, 2, 3, 5.5, 14, 15),
  ),
  read('IC-A28A', 'II.A-28A', 'four bolts at 3 in, e_x 2.5 in', '3.07', () => coefficient(4, 1, 3, 0, 2.5)),
  ...canadian,
  elastic,
];
