import type { ParameterValues } from '../../engine/index.ts';
import { type Check, printed, type RoundedFirst, rounding, threeFigures } from '../check.ts';
import { asked, capacityOf, type WholeDetail } from './detail.ts';

const s275 = { fy: 275, fu: 430 };
const m20 = { bolt_size: { d: 20, stressArea: 245 }, bolt_grade: { fyb: 640, fub: 800 }, hole_diameter: 22 };
const waived = { fit_checks: 'waived', practice_rules: 'waived', exposure: 'sheltered' } as const;
const beam = (depth: number, webThickness: number, flangeThickness: number) => ({
  shape: 'i',
  depth,
  width: 200,
  webThickness,
  flangeThickness,
  rootRadius: 10,
});

const multiStorey: WholeDetail = {
  kind: 'end-plate',
  basis: 'en-1993-1-8-2005',
  angle: 90,
  sense: 'tension',
  values: {
    ...m20,
    ...waived,
    plate_thickness: 12,
    plate_steel: s275,
    plate_width: 200,
    plate_end_distance: 40,
    rows: 6,
    pitch: 70,
    gauge: 140,
    long_joint: 'even',
    beam_section: beam(600, 12, 19),
    beam_steel: s275,
  },
};
const tabulated = (webThickness: number, rows: number): WholeDetail => ({
  ...multiStorey,
  values: {
    ...multiStorey.values,
    plate_thickness: 10,
    plate_width: 150,
    gauge: 90,
    rows,
    weld_leg: 6,
    beam_section: beam(500, webThickness, 16),
  },
});

const european: readonly Check[] = [
  {
    id: 'PDE-03-BS',
    basis: multiStorey.basis,
    clause: 'Table 3.4 with 0.8',
    source:
      'Steel Buildings in Europe, Multi-Storey Steel Buildings Part 5: Joint Design, partial depth end plate',
    evidence: 'found in text',
    inputs: 'whole end plate 430 × 200 × 12 S275; 6 rows of two M20 8.8 at 70',
    published: printed('902'),
    unit: 'kN',
    roundedFirst: rounding('shear of one bolt', 94, 94.08),
    ...asked(multiStorey, 'BS'),
  },
  ...(
    [
      ['PDE-04-MV', 'UKB 406x178x74 S275, t_w 9.5; plate 290 high, four rows', tabulated(9.5, 4), '394'],
      ['PDE-05-MV', 'UKB 533x210x92 S275, t_w 10.1; plate 430 high, six rows', tabulated(10.1, 6), '621'],
    ] as const
  ).map(([id, inputs, whole, value]): Check => ({
    id,
    basis: whole.basis,
    clause: 'EN 1993-1-1 6.2.6 with 0.9',
    source: 'tabulated resistances of partial depth end plates, S275 (British practice)',
    evidence: 'found in text',
    inputs,
    published: printed(value),
    unit: 'kN',
    ...asked(whole, 'MV'),
  })),
];

const inch = (value: number): number => value * 25.4;
const ksi = (value: number): number => value * 6.894757;
const kips = (kilonewtons: number): number => kilonewtons / 4.448222;

/** W18×50 on a plate 1/4 × 8 1/2 in, three rows of two 3/4 in bolts of Group 120, threads in the plane. */
const shear: ParameterValues = {
  ...waived,
  plate_thickness: inch(1 / 4),
  plate_steel: { fy: ksi(50), fu: ksi(65) },
  plate_width: inch(8),
  plate_end_distance: inch(1.25),
  rows: 3,
  pitch: inch(3),
  gauge: inch(5.5),
  weld_leg: inch(3 / 16),
  weld_ends: 'deducted',
  electrode: { xu: ksi(70) },
  bolt_size: { d: inch(3 / 4), stressArea: 215.5 },
  bolt_grade: { fyb: ksi(92), fub: ksi(120) },
  hole_diameter: inch(13 / 16),
  long_joint: 'even',
  block_pull: 'even',
  beam_section: beam(inch(18), inch(0.355), inch(0.57)),
  beam_steel: { fy: ksi(50), fu: ksi(65) },
};

interface Step {
  readonly code: string;
  readonly clause: string;
  readonly lrfd: number;
  readonly asd: number;
  /** A published chain that is rounded to three figures on its way. */
  readonly rounded: readonly [what: string, asPrinted: number, exact: number];
  readonly values?: ParameterValues;
}

const steps: readonly Step[] = [
  { code: 'PV', clause: 'J4.2(a)', lrfd: 128, asd: 85.3, rounded: ['R_n', 128, 127.5] },
  {
    code: 'PN',
    clause: 'J4.2(b)',
    lrfd: 86.3,
    asd: 57.5,
    rounded: ['A_nv both sides', 2.95, 2.9375],
    values: { hole_diameter: inch(7 / 8) - 2 },
  },
  {
    code: 'PX',
    clause: 'J4.3',
    lrfd: 93.8,
    asd: 62.5,
    rounded: ['A_gv', 3.63, 3.625],
    values: { hole_diameter: inch(7 / 8) - 2 },
  },
  { code: 'WM', clause: 'J2.4', lrfd: 67.9, asd: 45.3, rounded: ['counted length', 8.13, 8.125] },
];

const american: readonly Check[] = (['lrfd', 'asd'] as const).flatMap((format) =>
  steps.map(({ code, clause, rounded, values, ...step }): Check => {
    const basis = `aisc-360-2022-${format}` as const;
    const whole: WholeDetail = { ...multiStorey, basis, values: { ...shear, ...values } };
    const roundedFirst: RoundedFirst = rounding(...rounded);
    return {
      id: `C-IIA11A-${code}-${format.toUpperCase()}`,
      basis,
      clause,
      source:
        'Companion to the AISC Steel Construction Manual, Vol. 1: Design Examples, Version 16.0, Example II.A-11A, shear end plate',
      evidence: 'found in text',
      inputs: 'whole end plate 1/4 × 8 1/2 in; 3 × 2 bolts 3/4 in; l_ev 1.25, l_eh 1.25; F_y 50, F_u 65 ksi',
      published: threeFigures(step[format]),
      unit: 'kips',
      ours: () => kips(capacityOf(whole, code)),
      asks: { kind: 'end-plate', code },
      roundedFirst,
    };
  }),
);

/** Whole end plates against published worked examples and tables. */
export const endPlates: readonly Check[] = [...european, ...american];
