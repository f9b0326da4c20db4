import type { BasisId } from '../../engine/index.ts';
import type { Check } from '../check.ts';
import { asked, type WholeDetail } from './detail.ts';

/*
 * A whole gusset plate to CSA S16:19 and to ANSI/AISC 360-22, every limit state worked out from its clause below: plate 14
 * (340/470), weld 2 × 410 × 9 with Xu 480, two lines of three M20 at 75 × 66 from 260, ends 58 and 52, edges 47; two angles
 * 160 × 100 × 12 (345/460) back to back. At 0°: pull for all but the buckling of the plate.
 */
const values = {
  plate_thickness: 14,
  plate_steel: { fy: 340, fu: 470 },
  outline: 'tapered',
  gusset_end_distance: 58,
  gusset_edge_distance: 47,
  hole_making: 'drilled',
  weld_length: 410,
  weld_leg: 9,
  electrode: { xu: 480 },
  work_line_offset: 0,
  bolt_size: { d: 20, stressArea: 245 },
  bolt_grade: { fyb: 640, fub: 800 },
  hole_diameter: 22,
  rows: 3,
  lines: 2,
  pitch: 75,
  gauge: 66,
  first_row: 260,
  brace: 'back_to_back',
  section: { shape: 'angle', longLeg: 160, shortLeg: 100, thickness: 12, rootRadius: 13, area: 3010 },
  member_steel: { fy: 345, fu: 460 },
  member_backmark: 55,
  member_end_distance: 52,
} as const;

const area = (Math.PI * 20 * 20) / 4;
/** From the outer bolt line to the side of the plate at the first row, mm. */
const side = 80 + ((205 - 80) * (468 - 260)) / 468 - 33;
/** Half of the spread width, mm. */
const spread = 150 * Math.tan(Math.PI / 6) + 33;

const csaMean = 0.6 * ((340 + 470) / 2);
const csaMeanBrace = 0.6 * ((345 + 460) / 2);
const csaSlenderness = ((1.2 * 260 * Math.sqrt(12)) / 14 / Math.PI) * Math.sqrt(340 / 200_000);

/** N, and how each was worked out. */
const csa: Readonly<Record<string, readonly [number, string, string]>> = {
  WM: [
    0.67 * 0.67 * (9 / Math.SQRT2) * 480 * 1.5 * 820,
    '13.13.2.2',
    '0.67 φ_w A_w X_u (1 + 0.5 sin^1.5 90°)',
  ],
  WB: [0.67 * 0.67 * 9 * 470 * 820, '13.13.2.2', '0.67 φ_w A_m F_u'],
  PW: [0.9 * 340 * 14 * 410, '13.1', 'φ F_y t L'],
  BS: [6 * 0.6 * 0.8 * 2 * area * 800 * 0.7, '13.12.1.2(c)', '0.60 φ_b n m A_b F_u × 0.70'],
  GB: [6 * 3 * 0.8 * 14 * 20 * 470, '13.12.1.2(a)', '3 φ_br n t d F_u'],
  MB: [6 * 3 * 0.8 * 24 * 20 * 460, '13.12.1.2(a)', '3 φ_br n t d F_u, both angles'],
  GX: [
    Math.min(
      0.75 * (14 * (66 - 22) * 470 + 14 * 416 * csaMean),
      0.75 * (0.6 * 14 * (66 + side - 33) * 470 + 14 * 208 * csaMean),
      0.75 * (14 * (2 * side - 22) * 470 + 14 * 416 * csaMean),
      0.75 * 14 * 4 * 208 * csaMean,
    ),
    '13.11',
    'φ_u (U_t A_n F_u + 0.6 A_gv (F_y + F_u)/2), the least block',
  ],
  MX: [
    2 *
      Math.min(
        0.75 * (0.6 * 12 * (66 - 22) * 460 + 12 * 404 * csaMeanBrace),
        0.75 * (0.6 * 12 * (66 + 39 - 33) * 460 + 12 * 202 * csaMeanBrace),
      ),
    '13.11',
    'φ_u (0.6 A_n F_u + 0.6 A_gv (F_y + F_u)/2), the least block',
  ],
  WH: [
    Math.min(0.9 * 340 * 14 * 2 * spread, 0.75 * 470 * 14 * (2 * spread - 44)),
    '13.2',
    'yield and rupture',
  ],
  GC: [
    0.9 * 14 * 2 * spread * 340 * (1 + csaSlenderness ** 2.68) ** (-1 / 1.34),
    '13.3.1',
    'φ A F_y (1 + λ^2n)^(−1/n), n 1.34, K 1.2',
  ],
  MN: [2 * 0.75 * 0.6 * (3010 - 2 * 22 * 12) * 460, '12.3.3.2, 13.2(a)(iii)', 'φ_u 0.60 A_n F_u'],
  MY: [0.9 * 2 * 3010 * 345, '13.2(a)(i)', 'φ A F_y'],
};

const aiscPlate = (ant: number, length: number, planes: number) =>
  14 * Math.min(0.6 * 470 * (length - planes * 2.5 * 24), 0.6 * 340 * length) + 14 * 470 * ant;
const aiscBrace = (ant: number, length: number, planes: number) =>
  12 * Math.min(0.6 * 460 * (length - planes * 2.5 * 24), 0.6 * 345 * length) + 12 * 460 * ant;
/** x̄ of the connected leg from the legs themselves, and F_e of the strip. */
const xBar = (160 * 12 + 100 * 100 - 12 * 12) / (2 * (160 + 100 - 12));
const elastic = (Math.PI ** 2 * 200_000) / ((1.2 * 260 * Math.sqrt(12)) / 14) ** 2;

/** Available strengths with the factors of yielding and of rupture of one format, N. */
function aisc(ofYield: number, ofRupture: number): typeof csa {
  const bolts = ofRupture * 6 * 0.45 * 800 * area * 2;
  return {
    WM: [
      ofRupture * 0.6 * 480 * (9 / Math.SQRT2) * 1.5 * 820,
      'J2.4(a)',
      '0.60 F_EXX (1 + 0.5 sin^1.5 90°) A_we',
    ],
    WB: [ofRupture * 470 * 7 * 820, 'J2.4, J4', 'F_u t/2 on each side of the plate'],
    PW: [ofYield * 340 * 14 * 410, 'J4.1(a)', 'F_y t L'],
    BS: [bolts, 'J3.7', '0.450 F_u of a threaded part, two planes, six bolts'],
    GB: [bolts, 'J3.11a', 'the shear of each bolt is below its bearing'],
    MB: [bolts, 'J3.11a', 'the shear of each bolt is below its bearing'],
    GX: [
      ofRupture *
        Math.min(
          aiscPlate(66 - 24, 416, 2),
          aiscPlate(66 + side - 36, 208, 1),
          aiscPlate(2 * side - 24, 416, 2),
        ),
      'J4.3',
      'min(0.60 F_u A_nv, 0.60 F_y A_gv) + F_u A_nt, the least block',
    ],
    MX: [
      ofRupture * 2 * Math.min(aiscBrace(66 - 24, 404, 2), aiscBrace(66 + 39 - 36, 202, 1)),
      'J4.3',
      'min(0.60 F_u A_nv, 0.60 F_y A_gv) + F_u A_nt, the least block',
    ],
    WH: [
      Math.min(ofYield * 340 * 14 * 2 * spread, ofRupture * 470 * 14 * (2 * spread - 48)),
      'J4.1',
      'yield, and rupture with holes of 22 + 2',
    ],
    GC: [ofYield * 0.658 ** (340 / elastic) * 340 * 14 * 2 * spread, 'E3', '0.658^(F_y/F_e) F_y A, K 1.2'],
    MN: [
      ofRupture * 2 * 460 * (1 - xBar / 150) * (3010 - 2 * 24 * 12),
      'D2(b), D3',
      'U A_n F_u, U = 1 − x̄/150',
    ],
    MY: [ofYield * 345 * 2 * 3010, 'D2(a)', 'F_y A_g'],
  };
}

function checksOf(id: string, basis: BasisId, short: string, steps: typeof csa): Check[] {
  return Object.entries(steps).map(([code, [newtons, clause, note]]) => {
    const whole: WholeDetail = { basis, values, angle: 0, sense: code === 'GC' ? 'compression' : 'tension' };
    return {
      id: `${id}-${code}`,
      basis,
      clause: `${short} ${clause}`,
      source: 'whole gusset plate, worked by hand from the clauses (from memory)',
      evidence: 'rule evaluation',
      inputs: 'plate 14, weld 2 × 410 × 9, 2 × 3 M20 at 75 × 66, two angles 160 × 100 × 12; 0°',
      published: { value: newtons / 1000, place: 0.001 },
      unit: 'kN',
      ...asked(whole, code),
      note,
    };
  });
}

export const gussetPlatesNorthAmerica: readonly Check[] = [
  ...checksOf('G-CSA', 'csa-s16-2019', 'CSA S16', csa),
  ...checksOf('G-LRFD', 'aisc-360-2022-lrfd', 'AISC 360', aisc(0.9, 0.75)),
  ...checksOf('G-ASD', 'aisc-360-2022-asd', 'AISC 360', aisc(1 / 1.67, 1 / 2)),
];
