import { catalogue as reference, toEngineCatalogue } from '@catalog/index.ts';
import {
  type BasisId,
  findKind,
  type ParameterValues,
  type PartialFactors,
  type PreparedDetail,
  type Sense,
  toRadians,
} from '@shared/engine/index.ts';

export const catalogue = toEngineCatalogue(reference);
export const SANS = 'sans-10162-1-2011' satisfies BasisId;
export const EN = 'en-1993-1-8-2005' satisfies BasisId;
export const bothBases = [SANS, EN] as const;

/** Order of the limit states in the array that `at` fills. */
export const codes = ['WM', 'WB', 'PW', 'BS', 'GB', 'MB', 'GX', 'MX', 'WH', 'GC', 'MN', 'MY'] as const;
export type Code = (typeof codes)[number];

/**
 * A detail whose lengths all differ from one another, with strengths given by numbers, so that swapped
 * arguments show. Two angles back to back, two lines of three bolts.
 */
export const plain = {
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
} as const satisfies ParameterValues;

/** Prepares a gusset plate or fails the test with its faults. */
export function prepare(
  basis: BasisId,
  values: ParameterValues,
  factors?: Partial<PartialFactors>,
): PreparedDetail {
  const kind = findKind('gusset-plate');
  if (kind === undefined) throw new Error('the gusset plate kind is missing');
  const result = kind.prepare(values, basis, catalogue, factors);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.detail;
}

/** Capacities by code, N, at a load angle in degrees. Fails the test where the detail is not permitted. */
export function capacities(
  basis: BasisId,
  values: ParameterValues,
  degrees: number,
  sense: Sense = 'tension',
): Record<Code, number> {
  const detail = prepare(basis, values);
  const out = new Float64Array(codes.length);
  const theta = toRadians(degrees);
  if (detail.at(theta, sense, out) < 0) throw new Error(JSON.stringify(detail.outcome(theta, sense)));
  return Object.fromEntries(codes.map((code, index) => [code, out[index]])) as Record<Code, number>;
}

/** Rules that a detail breaks at a load angle in degrees, with their numbers. */
export function broken(basis: BasisId, values: ParameterValues, degrees = 0) {
  const outcome = prepare(basis, values).outcome(toRadians(degrees), 'tension');
  return outcome.status === 'not-permitted' ? outcome.rejections : [];
}
