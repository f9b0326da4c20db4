import type fc from 'fast-check';
import {
  type BasisId,
  findKind,
  type ParameterValues,
  type PreparedDetail,
  toRadians,
} from '@shared/engine/index.ts';
import { type Ranges, valuesOf } from './arbitrary.ts';
import { catalogue } from './gusset.ts';

const kind = findKind('angle-cleats');

/** Order of the limit states in the array that `at` fills. */
export const codes = (kind?.limitStates ?? []).map(({ code }) => code);

/**
 * A pair whose lengths all differ from one another, with strengths given by numbers, so that swapped arguments show: four
 * M20 in the web, three rows of M22 at the support; the top of the beam is coped.
 */
export const plain = {
  support_connection: 'bolted_own',
  support_thickness: 13,
  support_steel: { fy: 265, fu: 410 },
  support_rows: 3,
  support_pitch: 80,
  support_backmark: 54,
  support_bolt_size: { d: 22, stressArea: 303 },
  support_bolt_grade: { fyb: 640, fub: 800 },
  support_hole_diameter: 24,
  cleat_section: { shape: 'angle', longLeg: 100, shortLeg: 95, thickness: 11, rootRadius: 12 },
  cleat_steel: { fy: 275, fu: 430 },
  cleat_end_distance: 41,
  hole_making: 'drilled',
  edge_finish: 'rolled',
  weld_leg: 6,
  electrode: { xu: 480 },
  bolt_size: { d: 20, stressArea: 245 },
  bolt_grade: { fyb: 640, fub: 800 },
  hole_diameter: 22,
  rows: 4,
  pitch: 72,
  web_backmark: 52,
  beam_section: {
    shape: 'i',
    depth: 420,
    width: 180,
    webThickness: 8.6,
    flangeThickness: 13.5,
    rootRadius: 21,
  },
  beam_steel: { fy: 345, fu: 460 },
  beam_gap: 12,
  beam_top_to_row: 110,
  cope_top_length: 90,
  cope_top_depth: 61,
} as const satisfies ParameterValues;

/** Thick enough that prying is shared between the legs and the bolts. */
export const thick = {
  ...plain,
  cleat_section: { ...plain.cleat_section, thickness: 18 },
  practice_rules: 'waived',
  fit_checks: 'waived',
} as const satisfies ParameterValues;

export const welded = { ...plain, support_connection: 'welded' } as const satisfies ParameterValues;
export const single = { ...plain, cleats: 1 } as const satisfies ParameterValues;

/** Prepares angle cleats or fails the test with their faults. */
export function prepare(basis: BasisId, values: ParameterValues): PreparedDetail {
  if (kind === undefined) throw new Error('the angle cleats kind is missing');
  const result = kind.prepare(values, basis, catalogue);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.detail;
}

/** Capacities of one angle by code, kN; fails the test where the detail breaks a rule. */
export function capacities(
  basis: BasisId,
  values: ParameterValues,
  degrees: number,
): Readonly<Record<string, number>> {
  const detail = prepare(basis, values);
  const out = new Float64Array(codes.length);
  const theta = toRadians(degrees);
  if (detail.at(theta, 'tension', out) < 0) throw new Error(JSON.stringify(detail.outcome(theta, 'tension')));
  return Object.fromEntries(codes.map((code, state) => [code, (out[state] ?? NaN) / 1000]));
}

/** Values that make sense together more often than the whole of each range would. mm. */
const likely: Ranges = {
  cleat_end_distance: [25, 80],
  cleat_length: [0, 0],
  weld_leg: [5, 10],
  pitch: [50, 130],
  gauge: [50, 110],
  rows: [1, 7],
  web_backmark: [0, 0],
  support_rows: [0, 0],
  support_pitch: [0, 0],
  support_backmark: [0, 0],
  support_thickness: [0, 30],
  hole_diameter: [0, 0],
  support_hole_diameter: [0, 0],
  beam_gap: [0, 15],
  beam_top_to_row: [0, 0],
  cope_top_length: [0, 0],
  cope_top_depth: [0, 0],
  cope_bottom_length: [0, 0],
  cope_bottom_depth: [0, 0],
  eccentricity: [0, 200],
};

/** Parameter values of angle cleats that pass their schema; `wide` draws from the whole of every range. */
export function cleatValues(wide: boolean): fc.Arbitrary<ParameterValues> {
  return valuesOf(kind?.parameters ?? [], likely, wide);
}
