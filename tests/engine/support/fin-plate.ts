import {
  type BasisId,
  findKind,
  type ParameterValues,
  type PartialFactors,
  type PreparedDetail,
  toRadians,
} from '@shared/engine/index.ts';
import { catalogue } from './gusset.ts';

export const SANS = 'sans-10162-1-2011' satisfies BasisId;
export const CSA = 'csa-s16-2019' satisfies BasisId;
export const EN = 'en-1993-1-8-2005' satisfies BasisId;
export const LRFD = 'aisc-360-2022-lrfd' satisfies BasisId;
export const ASD = 'aisc-360-2022-asd' satisfies BasisId;
export const everyBasis = [SANS, CSA, EN, LRFD, ASD] as const;

const kind = findKind('fin-plate');

/** Order of the limit states in the array that `at` fills. */
export const codes = (kind?.limitStates ?? []).map(({ code }) => code);

/**
 * A detail whose lengths all differ from one another, with strengths given by numbers, so that swapped arguments
 * show. Two columns of three bolts; the top of the beam is coped and the bolts sit above its middle.
 */
export const plain = {
  plate_thickness: 11,
  plate_steel: { fy: 280, fu: 420 },
  plate_end_distance: 43,
  plate_edge_distance: 51,
  hole_making: 'drilled',
  weld_leg: 9,
  electrode: { xu: 480 },
  bolt_size: { d: 22, stressArea: 303 },
  bolt_grade: { fyb: 640, fub: 800 },
  hole_diameter: 24,
  rows: 3,
  columns: 2,
  pitch: 75,
  gauge: 66,
  first_column: 62,
  beam_section: {
    shape: 'i',
    depth: 390,
    width: 180,
    webThickness: 8.5,
    flangeThickness: 13,
    rootRadius: 20,
  },
  beam_steel: { fy: 345, fu: 460 },
  beam_gap: 13,
  beam_top_to_row: 116,
  cope_top_length: 90,
  cope_top_depth: 61,
  weld_size: 'as_designed',
} as const satisfies ParameterValues;

/** Prepares a fin plate or fails the test with its faults. */
export function prepare(
  basis: BasisId,
  values: ParameterValues,
  factors?: Partial<PartialFactors>,
): PreparedDetail {
  if (kind === undefined) throw new Error('the fin plate kind is missing');
  const result = kind.prepare(values, basis, catalogue, factors);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.detail;
}

/** Capacities of one angle by code, N; fails the test where the detail breaks a rule. */
export function capacities(detail: PreparedDetail, degrees: number): Readonly<Record<string, number>> {
  const out = new Float64Array(detail.limitStates.length);
  const index = detail.at(toRadians(degrees), 'tension', out);
  if (index < 0) {
    throw new Error(JSON.stringify(detail.outcome(toRadians(degrees), 'tension')));
  }
  return Object.fromEntries(detail.limitStates.map(({ code }, state) => [code, out[state] ?? NaN]));
}
