import type { ParameterValues } from '@shared/engine/index.ts';

/**
 * One table of gusset plates in EN 1993-1-8, small enough to be laid out by hand in a spreadsheet: a tapered plate, two
 * angles back to back, one line of M20, pull, no eccentricity. Both sides of the comparison take their numbers from here.
 */
export const fixed = {
  fy: 345,
  fu: 470,
  weldLength: 400,
  firstRow: 220,
  gussetEnd: 50,
  gussetEdge: 60,
  memberEnd: 45,
  hole: 22,
  d: 20,
  stressArea: 245,
  fub: 800,
  /** L100x100x10 */
  legThickness: 10,
  legArea: 1920,
  toe: 45,
} as const;

export const swept = {
  plate_thickness: [10, 12, 14, 16, 18],
  weld_leg: [6, 8, 10],
  rows: [2, 3, 4, 5],
  pitch: [65, 75],
} as const;

/** Load angles, degrees. */
export const angles: readonly number[] = Array.from({ length: 46 }, (_, at) => -30 + 2 * at);

export interface Row {
  readonly t: number;
  readonly z: number;
  readonly n: number;
  readonly p: number;
}

export const rows: readonly Row[] = swept.plate_thickness.flatMap((t) =>
  swept.weld_leg.flatMap((z) => swept.rows.flatMap((n) => swept.pitch.map((p) => ({ t, z, n, p })))),
);

const steel = { fy: fixed.fy, fu: fixed.fu };

/** The same variant as parameters of the gusset plate kind. */
export const valuesOf = ({ t, z, n, p }: Row): ParameterValues => ({
  plate_thickness: t,
  plate_steel: steel,
  member_steel: steel,
  outline: 'tapered',
  weld_length: fixed.weldLength,
  weld_leg: z,
  rows: n,
  lines: 1,
  pitch: p,
  first_row: fixed.firstRow,
  gusset_end_distance: fixed.gussetEnd,
  gusset_edge_distance: fixed.gussetEdge,
  member_end_distance: fixed.memberEnd,
  hole_diameter: fixed.hole,
  bolt_size: 'M20',
  bolt_grade: '8.8',
  brace: 'back_to_back',
  section: 'L100x100x10',
  fit_checks: 'waived',
});
