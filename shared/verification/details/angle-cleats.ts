import type { ParameterValue, ParameterValues } from '../../engine/index.ts';
import { plasticMoment, tyingFactor } from '../../engine/standards/en-1993-1-8-2005/index.ts';
import { type Check, printed, type RoundedFirst, rounding, threeFigures } from '../check.ts';
import { asked, capacityOf, type WholeDetail } from './detail.ts';

const s275 = { fy: 275, fu: 430 };
const waived = { fit_checks: 'waived', practice_rules: 'waived' } as const;
const angle = (longLeg: number, shortLeg: number, thickness: number, rootRadius: number) => ({
  shape: 'angle',
  longLeg,
  shortLeg,
  thickness,
  rootRadius,
});
const beam = (depth: number, width: number, webThickness: number, flangeThickness: number) => ({
  shape: 'i',
  depth,
  width,
  webThickness,
  flangeThickness,
  rootRadius: 10,
});

/** Nothing comes from a catalogue, so that the bolts at the support are given as well where they are the same. */
const bolts = (bolt_size: ParameterValue, bolt_grade: ParameterValue) => ({
  bolt_size,
  bolt_grade,
  support_bolt_size: bolt_size,
  support_bolt_grade: bolt_grade,
});
const m20 = {
  ...bolts({ d: 20, stressArea: 245 }, { fyb: 640, fub: 800 }),
  hole_diameter: 22,
};

/** Two cleats on an IPE A 550; bolts 50 from the heel both ways, so that the cross centres are 109. */
const published: WholeDetail = {
  kind: 'angle-cleats',
  basis: 'en-1993-1-8-2005',
  angle: 90,
  sense: 'tension',
  values: {
    cleat_section: angle(90, 90, 10, 11),
    cleat_steel: s275,
    cleat_end_distance: 40,
    ...m20,
    rows: 6,
    pitch: 70,
    web_backmark: 50,
    support_backmark: 50,
    beam_section: beam(547, 210, 9, 15.7),
    beam_steel: s275,
    beam_top_to_row: 90,
    beam_gap: 10,
    shear_line: 'support',
    long_joint: 'even',
    leg_bending: 'tensile',
  },
};
const pulled: WholeDetail = { ...published, angle: 0 };
const concentric: WholeDetail = { ...published, values: { ...published.values, shear_line: 'bolts' } };

const en = {
  basis: published.basis,
  evidence: 'found in text',
  unit: 'kN',
  inputs:
    'two cleats 90 × 90 × 10 S275 (430), 430 long; 6 M20 8.8 at 70, 50 from the heel; e_1 40, e_2 40; IPE A 550, t_w 9, e_1b 90, e_2b 40',
} as const;
const multiStorey = (place: string) =>
  `Steel Buildings in Europe, Multi-Storey Steel Buildings Part 5: Joint Design, 4.4 angle web cleats, ${place}`;
/** Shear of a bolt that shares equally over that of the most loaded one. */
const unevenness = (one: WholeDetail, other: WholeDetail) => capacityOf(one, 'BS') / capacityOf(other, 'BS');

const european: readonly Check[] = [
  {
    ...en,
    id: 'CLT-01-BS',
    clause: 'elastic group',
    source: multiStorey('sheet 3, p. 5-70'),
    published: printed('0.102'),
    unit: '',
    ours: () => Math.sqrt(unevenness(concentric, published) ** 2 - 1) / 6,
    note: 'β of V = n F_v,Rd/√(1 + (β n)²)',
  },
  {
    ...en,
    id: 'CLT-02-BS',
    clause: 'Table 3.4, elastic group',
    source: multiStorey('sheets 2 and 3'),
    published: printed('962'),
    roundedFirst: rounding('shear of one bolt', 188, 188.16),
    ...asked(published, 'BS'),
  },
  {
    ...en,
    id: 'CLT-03-CB',
    clause: 'Table 3.4, 3.7',
    source: multiStorey('sheet 2'),
    published: printed('1075'),
    // α_b = 40/66 is printed as 0.61, across as along.
    roundedFirst: rounding('bearing of one bolt', 105, 104.2424),
    ...asked(published, 'CB'),
    note: 'exact 1066.8',
  },
  {
    ...en,
    id: 'CLT-04-MB',
    clause: 'Table 3.4, 3.7',
    source: multiStorey('summary'),
    published: printed('583'),
    ...asked(published, 'MB'),
  },
  {
    ...en,
    id: 'CLT-07-SS',
    clause: 'Table 3.4 with 0.8',
    source: multiStorey('p. 5-74'),
    published: printed('902'),
    roundedFirst: rounding('shear of one bolt', 94, 94.08),
    ...asked(published, 'SS'),
  },
  {
    ...en,
    id: 'CLT-09-CX',
    clause: '3.10.2(3)',
    source: multiStorey('summary'),
    published: printed('954'),
    ...asked(published, 'CX'),
  },
  {
    ...en,
    id: 'CLT-09-CY',
    clause: '3.10.2(3)',
    source: multiStorey('summary'),
    published: printed('954'),
    ...asked(published, 'CY'),
    note: 'the outstanding legs have the distances of the web legs',
  },
  {
    ...en,
    id: 'CLT-10-MX',
    clause: '3.10.2(3)',
    source: multiStorey('summary'),
    published: printed('501'),
    ...asked(published, 'MX'),
  },
  {
    ...en,
    id: 'CLT-11-CF',
    clause: 'Table 6.2',
    source: multiStorey('sheet 11, p. 5-78'),
    published: printed('4.2'),
    unit: 'kN·m',
    asks: { kind: 'angle-cleats', code: 'CF' },
    ours: () => (capacityOf(pulled, 'CF') * 0.0312) / 4,
    note: 'plastic moment of all rows with f_u/γ_Mu, from mode 1 = 4 M_pl/m',
  },
  {
    ...en,
    id: 'CLT-12-CF',
    clause: 'Table 6.2',
    source: multiStorey('p. 5-78'),
    published: printed('31'),
    unit: 'mm',
    asks: { kind: 'angle-cleats', code: 'CF' },
    ours: () => (4 * plasticMoment(430, 10, 430 / tyingFactor)) / (1000 * capacityOf(pulled, 'CF')),
    note: 'm = (p_3 − t_w − 2 t_ac − 1.6 r)/2, from mode 1 = 4 M_pl/m',
  },
];

const three = (shear_line: 'support' | 'bolts'): WholeDetail => ({
  ...published,
  values: { ...published.values, ...waived, rows: 3, pitch: 100, shear_line },
});
const group: Check = {
  id: 'GRP-03-BS',
  basis: published.basis,
  clause: 'elastic group',
  source: 'thestructuralengineer.info, calculation example of a shear bolt connection to EC3',
  evidence: 'found in text',
  inputs: 'V 500 at 50 from a column of 3 bolts at 100: the part of the outer bolt across the face',
  published: printed('125'),
  unit: 'kN',
  ours: () => 500 * Math.sqrt((unevenness(three('bolts'), three('support')) / 3) ** 2 - 1 / 9),
};

const inch = (value: number): number => value * 25.4;
const ksi = (value: number): number => value * 6.894757;
const kips = (kilonewtons: number): number => kilonewtons / 4.448222;
const gradeFifty = { fy: ksi(50), fu: ksi(65) };

/** 2L5×3 1/2×5/16, short legs on the web of a W36×231; net areas lose 7/8 in with the hole 2 mm below it. */
const doubleAngle: ParameterValues = {
  ...waived,
  cleat_section: angle(inch(5), inch(3.5), inch(5 / 16), 0),
  web_leg: 'short',
  cleat_steel: gradeFifty,
  cleat_end_distance: inch(1.25),
  ...bolts({ d: inch(0.75), stressArea: 215.5 }, { fyb: ksi(92), fub: ksi(120) }),
  hole_diameter: inch(0.875) - 2,
  rows: 8,
  pitch: inch(3),
  web_backmark: inch(3.5) - inch(1.375),
  support_backmark: inch(3),
  beam_section: beam(inch(36.5), inch(16.5), inch(0.76), inch(1.26)),
  beam_steel: gradeFifty,
  beam_gap: inch(0.5),
  shear_line: 'bolts',
  long_joint: 'even',
};
const ownHole = { hole_diameter: inch(13 / 16) };

interface Step {
  readonly code: string;
  readonly clause: string;
  /** Printed, kips. */
  readonly lrfd: number;
  readonly asd: number;
  readonly rounded?: Partial<Readonly<Record<'lrfd' | 'asd', RoundedFirst>>>;
  readonly values?: ParameterValues;
  /** Bolts and plies that the printed value is one of. */
  readonly parts?: number;
  readonly note?: string;
}

const steps: readonly Step[] = [
  { code: 'CV', clause: 'J4.2(a)', lrfd: 441, asd: 294 },
  { code: 'CN', clause: 'J4.2(b)', lrfd: 302, asd: 201 },
  { code: 'CX', clause: 'J4.3', lrfd: 315, asd: 210 },
  {
    code: 'CB',
    clause: 'J3.11a',
    lrfd: 15.5,
    asd: 10.3,
    rounded: { lrfd: rounding('R_n', 20.6, 20.5664) },
    values: ownHole,
    parts: 16,
    note: 'tear-out of one bolt at the end of one angle; shear at the bolts, so that they share it equally',
  },
  {
    code: 'MB',
    clause: 'J3.11a',
    lrfd: 66.7,
    asd: 44.5,
    values: ownHole,
    parts: 8,
    note: 'bearing of one bolt on the web',
  },
  {
    code: 'LB',
    clause: 'J3.7, J3.11a',
    lrfd: 282,
    asd: 187,
    rounded: {
      lrfd: rounding('14 × 17.9 + 2 × 15.5', 281.6, 281.343),
      asd: rounding('14 × 11.9 + 2 × 10.3', 187.2, 187.562),
    },
    values: ownHole,
    note: 'bolt by bolt; the bolts of the outstanding legs have the distances along the face of those in the web',
  },
];

const american: readonly Check[] = (['lrfd', 'asd'] as const).flatMap((format) =>
  steps.map(({ code, clause, rounded, values, parts, note, ...step }): Check => {
    const basis = `aisc-360-2022-${format}` as const;
    const whole: WholeDetail = { ...published, basis, values: { ...doubleAngle, ...values } };
    const roundedFirst = rounded?.[format];
    return {
      id: `C-IIA1A-${code}-${format.toUpperCase()}`,
      basis,
      clause,
      source:
        'Companion to the AISC Steel Construction Manual, Vol. 1: Design Examples, Version 16.0, Example II.A-1A, all-bolted double angle',
      evidence: 'found in text',
      inputs:
        'two angles 5 × 3 1/2 × 5/16 in, 23 1/2 long; 8 bolts 3/4 in of Group 120-N at 3; l_ev 1 1/4, l_eh 1 3/8; F_y 50, F_u 65 ksi',
      published: threeFigures(step[format]),
      unit: 'kips',
      asks: { kind: 'angle-cleats', code },
      ours: () => kips(capacityOf(whole, code)) / (parts ?? 1),
      ...(roundedFirst === undefined ? {} : { roundedFirst }),
      ...(note === undefined ? {} : { note }),
    };
  }),
);

/** One angle 102 × 76 × 9.53 on a coped W410×39, the long leg on the web. */
const single: WholeDetail = {
  ...published,
  basis: 'csa-s16-2019',
  values: {
    ...waived,
    cleats: 1,
    cleat_section: angle(102, 76, 9.53, 0),
    web_leg: 'long',
    cleat_steel: { fy: 350, fu: 450 },
    cleat_end_distance: 30,
    edge_finish: 'rolled',
    ...bolts({ d: 20, stressArea: 245 }, { fyb: 660, fub: 830 }),
    hole_diameter: 22,
    rows: 2,
    pitch: 60,
    web_backmark: 65,
    beam_section: { ...beam(399, 140, 6.4, 8.8), rootRadius: 11 },
    beam_steel: { fy: 350, fu: 450 },
    beam_gap: 5,
    beam_top_to_row: 65,
    cope_top_length: 100,
    cope_top_depth: 35,
  },
};

const canadian: readonly Check[] = (
  [
    ['CX', 'block shear of the angle: U_t 0.6, A_n 238, A_gv 858', 203],
    ['MX', 'block shear of the web: U_t 0.9, A_n 307, A_gv 576', 197],
  ] as const
).map(([code, what, value]) => ({
  id: `D-C30-${code}`,
  basis: single.basis,
  clause: '13.11',
  source: 'Carleton University CIVE 3205 (N. Holtz), to CSA S16-14 and the CISC Handbook, Example C30',
  evidence: 'found in text',
  inputs: `single angle 102 × 76 × 9.5, 120 long; 2 M20 at 60; ${what}`,
  published: threeFigures(value),
  unit: 'kN',
  ...asked(single, code),
}));

/** Whole pairs of cleats and a single one against published worked examples. */
export const angleCleats: readonly Check[] = [...european, group, ...american, ...canadian];
