import { type Check, printed } from '../check.ts';
import { asked, type WholeDetail } from './detail.ts';

/** A limit state's code, its clause, the value by hand in kN, and the arithmetic. */
type Step = readonly [code: string, clause: string, kN: string, arithmetic: string];

function byHand(id: string, inputs: string, whole: WholeDetail, steps: readonly Step[]): Check[] {
  return steps.map(([code, clause, kN, note]) => ({
    id: `${id}-${code}`,
    basis: whole.basis,
    clause,
    source: 'whole gusset plate, worked by hand from the clauses (from memory)',
    evidence: 'rule evaluation',
    inputs,
    published: printed(kN),
    unit: 'kN',
    ...asked(whole, code),
    note,
  }));
}

const m20 = { bolt_size: { d: 20, stressArea: 245 }, hole_diameter: 22 };
const s275 = { fy: 275, fu: 430 };

const pulledOffCentre: WholeDetail = {
  basis: 'en-1993-1-8-2005',
  angle: 0,
  sense: 'tension',
  values: {
    ...m20,
    bolt_grade: { fyb: 640, fub: 800 },
    rows: 4,
    lines: 1,
    pitch: 70,
    first_row: 150,
    plate_thickness: 12,
    plate_steel: s275,
    outline: 'tapered',
    gusset_end_distance: 45,
    gusset_edge_distance: 55,
    weld_length: 300,
    weld_leg: 8,
    work_line_offset: 30,
    brace: 'flat',
    section: { shape: 'flat', width: 120, thickness: 10 },
    member_steel: s275,
    member_end_distance: 45,
  },
};

const en: readonly Check[] = byHand(
  'G-EN-1',
  'plate 12, weld 2 × 300 × 8, e 30; flat 120 × 10, 4 M20 8.8 at 70; S275 (430); pulled at 0°',
  pulledOffCentre,
  [
    [
      'WM',
      '4.5.3.2',
      '607.06',
      'f_x = 1/600 + 30 × 150 × 6/300³ = 0.0026667 per N; a = 8/√2; √2 f_x/a = 430/(0.85 × 1.25)',
    ],
    ['PW', 'EN 1993-1-1 6.2.1(5)', '618.75', '275/(1/3600 + 30/180000)'],
    ['BS', 'Table 3.4', '376.32', '4 × 0.6 × 800 × 245/1.25'],
    [
      'GB',
      'Table 3.4, 3.7',
      '562.91',
      '4 × 2.5 × (45/66) × 430 × 20 × 12/1.25; the shear of a bolt is below its bearing',
    ],
    ['MB', 'Table 3.4, 3.7', '469.09', '4 × 2.5 × (45/66) × 430 × 20 × 10/1.25'],
    [
      'GX',
      '3.10.2(3)',
      '514.42',
      'side at the first row 120 − 65 × 150/405 = 95.926; 0.5 × 430 × 12 (95.926 − 11)/1.25 + 275 × 12 (255 − 3.5 × 22)/√3',
    ],
    ['MX', '3.10.2(3)', '366.89', '0.5 × 430 × 10 (60 − 11)/1.25 + 275 × 10 (255 − 3.5 × 22)/√3'],
    [
      'WH',
      'EN 1993-1-1 6.2.3',
      '716.66',
      'width 95.926 + 210 tan 30° = 217.170, cut above by the outline; 12 × 217.170 × 275',
    ],
    ['MN', 'EN 1993-1-1 6.2.3', '303.408', '0.9 (120 − 22) 10 × 430/1.25'],
    ['MY', 'EN 1993-1-1 6.2.3', '330.0', '120 × 10 × 275'],
    ['R', 'EN 1993-1-1 6.2.3', '303.408', 'the least: the net section of the brace'],
  ],
);

const pushedDown: WholeDetail = {
  basis: 'en-1993-1-8-2005',
  angle: -25,
  sense: 'compression',
  values: {
    ...m20,
    bolt_grade: { fyb: 640, fub: 800 },
    rows: 3,
    lines: 1,
    pitch: 75,
    first_row: 190,
    plate_thickness: 12,
    plate_steel: s275,
    outline: 'rectangular',
    projection: 360,
    weld_length: 380,
    weld_leg: 7,
    work_line_offset: 35,
    brace: 'flat',
    section: { shape: 'flat', width: 120, thickness: 12 },
    member_steel: s275,
    member_end_distance: 45,
  },
};

const enPushed: readonly Check[] = byHand(
  'G-EN-2',
  'plate 12, rectangular 380 × 360, weld 2 × 380 × 7, e 35; flat 120 × 12, 3 M20 8.8 at 75; S275 (430); pushed at −25°',
  pushedDown,
  [
    [
      'WM',
      '4.5.3.2',
      '718.00',
      'upper end: f_x = 0.9063/760 + 0.9063 × 35 × 190 × 6/380³ = 0.00185153, f_y = −0.4226/760 = −0.00055608 per N; a = 7/√2',
    ],
    ['PW', 'EN 1993-1-1 6.2.1(5)', '790.59', '275/√((0.9063/4560 + 0.9063 × 35/288800)² + 3 (0.4226/4560)²)'],
    ['BS', 'Table 3.4', '282.24', '3 × 0.6 × 800 × 245/1.25'],
    [
      'GB',
      'Table 3.4, 3.7',
      '548.84',
      'no end ahead; α_b = 75/66 − 1/4 = 0.88636: 3 × 2.5 × 0.88636 × 430 × 20 × 12/1.25, the same along both edges',
    ],
    [
      'GC',
      'EN 1993-1-1 6.3.1',
      '393.49',
      'width 2 × 150 tan 30° = 173.205; L = (190 + 230.383 + 149.617)/3 = 190; λ̄ = 1.2 × 190 √12/12/(π √(210000/275)) = 0.75814; χ = 0.68843',
    ],
    ['MY', 'EN 1993-1-1 6.2.4', '396.0', '120 × 12 × 275'],
    ['R', 'Table 3.4', '282.24', 'the least: the bolts'],
  ],
);

const steepPull: WholeDetail = {
  basis: 'sans-10162-1-2011',
  angle: 35,
  sense: 'tension',
  values: {
    ...m20,
    bolt_grade: { fyb: 640, fub: 830 },
    rows: 4,
    lines: 1,
    pitch: 72,
    first_row: 235,
    plate_thickness: 14,
    plate_steel: { fy: 340, fu: 470 },
    outline: 'tapered',
    gusset_end_distance: 46,
    gusset_edge_distance: 58,
    weld_length: 340,
    weld_leg: 8,
    work_line_offset: -40,
    brace: 'back_to_back',
    member_steel: { fy: 345, fu: 460 },
    member_backmark: 60,
    member_end_distance: 52,
    section: { shape: 'angle', longLeg: 110, shortLeg: 90, thickness: 10, rootRadius: 12, area: 1920 },
  },
};

const sansInputs =
  'plate 14 (340/470), weld 2 × 340 × 8, Xu 480, e −40; two angles 110 × 90 × 10 (345/460), 4 M20 fub 830 at 72, punched; 35°';
const sans: readonly Check[] = byHand('G-SANS-1', `${sansInputs}, pulled`, steepPull, [
  [
    'WM',
    '13.13.2.2(b)',
    '792.84',
    'lower end: f_x = 0.81915/680 + 0.81915 × 40 × 170 × 6/340³ = 0.00205497, f_y = 0.57358/680 = 0.00084349 per N; θ_w 67.683°, not 35°: 0.67 × 0.67 (8/√2) 480 (1 + 0.5 sin^1.5 θ_w)/0.00222134',
  ],
  ['WB', '13.13.2.2(a)', '759.84', '0.67 × 0.67 × 8 × 470/0.00222134'],
  ['PW', '13.1', '849.54', '0.9 × 340/√((0.81915/4760 + 0.81915 × 40 × 6/(14 × 340²))² + 3 (0.57358/4760)²)'],
  ['BS', '13.12.1.1', '700.90', '4 × 2 × 0.60 × 0.80 × 0.70 × 314.159 × 830'],
  ['GB', '13.10', '811.18', '4 × 0.67 × 46 × 14 × 470: the end distance is below 3 d and the pitch'],
  ['MB', '13.10', '1282.11', '4 × 0.67 × 52 × 20 × 460'],
  [
    'GX',
    '13.11',
    '1036.51',
    'lower side at the first row 80.2273 (line from (0, −170) to (440.386, 197.557)): 0.9 × 14 (80.2273 − 12) 470 + 0.54 min(3668 × 340, 2492 × 470)',
  ],
  ['MX', '13.11', '1228.75', '2 [0.9 × 10 (50 − 12) 460 + 0.54 min(2680 × 345, 1840 × 460)]'],
  ['WH', '13.2(a)(i)', '877.94', 'width 216 tan 30° = 124.708 above, 80.227 below; 0.9 × 14 × 204.935 × 340'],
  ['MN', '12.3.3.2, 13.2(a)(ii)', '945.91', '2 × 0.85 × 0.9 × 0.80 (1920 − 24 × 10) 460'],
  ['MY', '13.2(a)(i)', '1192.32', '2 × 0.9 × 1920 × 345'],
  ['R', '13.12.1.1', '700.90', 'the least: the bolts'],
]);
const sansPushed: readonly Check[] = byHand(
  'G-SANS-2',
  `${sansInputs}, pushed`,
  { ...steepPull, sense: 'compression' },
  [
    [
      'GC',
      '13.3.1',
      '590.91',
      'L = (235 + 147.679 + 291.176)/3 = 224.618; λ = 1.2 × 224.618 √12/14/π √(340/200000) = 0.87531; 0.9 × 14 × 204.935 × 340 (1 + λ^2.68)^(−1/1.34)',
    ],
    ['R', '13.3.1', '590.91', 'the least: buckling of the gusset'],
  ],
);

/** Example C10 of the course notes, whose two lapped plates are a gusset and a flat here. */
const lap: WholeDetail = {
  basis: 'sans-10162-1-2011',
  angle: 0,
  sense: 'tension',
  values: {
    ...m20,
    bolt_grade: { fyb: 660, fub: 830 },
    rows: 3,
    lines: 2,
    pitch: 60,
    gauge: 60,
    first_row: 180,
    plate_thickness: 10,
    plate_steel: { fy: 350, fu: 450 },
    outline: 'tapered',
    gusset_end_distance: 60,
    gusset_edge_distance: 40,
    weld_length: 300,
    weld_leg: 8,
    brace: 'flat',
    section: { shape: 'flat', width: 140, thickness: 10 },
    member_steel: { fy: 350, fu: 450 },
    member_end_distance: 60,
  },
};
const course: readonly Check[] = (
  [
    ['BS', '13.12.1.1', '526'],
    ['MY', '13.2(a)(i)', '441'],
  ] as const
).map(([code, clause, text]) => ({
  id: `G-C10-${code}`,
  basis: 'sans-10162-1-2011',
  clause,
  source: 'Carleton University CIVE 3205 course notes (to CSA S16-14), example C10',
  evidence: 'found in text',
  inputs: 'two plates 140 × 10 (350/450) lapped, 6 M20 fub 830 in 2 lines of 3',
  published: printed(text),
  unit: 'kN',
  ...asked(lap, code),
  weak: 'printed for CSA S16, whose clause has the same expression and the same factor',
}));

export const gussetPlates: readonly Check[] = [...en, ...enPushed, ...sans, ...sansPushed, ...course];
