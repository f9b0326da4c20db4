import type { Basis, Rec } from '../standards/basis.ts';

/** tan 30 degrees: the spread of the force in the plate, each side. */
const SPREAD = Math.tan(Math.PI / 6);

/** Half of the spread width at the row nearest the support before any edge cuts it, mm. */
export function spreadHalfWidth(rows: number, pitch: number, lines: number, gauge: number): number {
  return (rows - 1) * pitch * SPREAD + ((lines - 1) * gauge) / 2;
}

/**
 * Part of one hole that lies in a width from -below to +above of the axis, mm.
 * @param q centre of the hole from the axis; `deduction` its diameter as deducted
 */
function holeInside(q: number, deduction: number, below: number, above: number): number {
  const low = Math.max(q - deduction / 2, -below);
  const high = Math.min(q + deduction / 2, above);
  return Math.max(0, high - low);
}

/**
 * Tension on the spread width: the lesser of yield on the gross and rupture on the net section, N.
 * @param above, below width each side of the axis, cut by the outline and by the face, mm
 */
export function whitmoreTension(
  basis: Basis,
  thickness: number,
  fy: number,
  fu: number,
  lines: number,
  gauge: number,
  deduction: number,
  above: number,
  below: number,
  rec: Rec,
): number {
  const holes =
    lines === 1
      ? holeInside(0, deduction, below, above)
      : holeInside(gauge / 2, deduction, below, above) + holeInside(-gauge / 2, deduction, below, above);
  const gross = thickness * (above + below);
  const net = Math.max(0, gross - thickness * holes);
  if (rec !== null) {
    recordWidth(above, below, rec);
    rec.line('A', 'gross section', 't (w_1 + w_2)', gross, 'mm²', basis.clauses.tensionSection);
    rec.line('A_net', 'less holes', 'A − t × holes', net, 'mm²', basis.clauses.tensionSection);
  }
  return Math.min(basis.tensionYield(gross, fy, rec), basis.tensionRupture(net, fu, rec));
}

/**
 * Compression on the spread width as a column as long as the mean of three lengths to the face, N.
 * @param lengths along the brace from the middle and the two ends of the width to the face, mm
 */
export function whitmoreBuckling(
  basis: Basis,
  thickness: number,
  fy: number,
  k: number,
  above: number,
  below: number,
  middle: number,
  upper: number,
  lower: number,
  rec: Rec,
): number {
  const area = thickness * (above + below);
  const length = (middle + upper + lower) / 3;
  const slenderness = (k * length * Math.sqrt(12)) / thickness;
  if (rec !== null) recordStrip(basis, area, above, below, middle, upper, lower, slenderness, rec);
  return basis.compression(area, fy, slenderness, rec);
}

function recordStrip(
  basis: Basis,
  area: number,
  above: number,
  below: number,
  middle: number,
  upper: number,
  lower: number,
  slenderness: number,
  rec: NonNullable<Rec>,
): void {
  const clause = basis.clauses.compression;
  recordWidth(above, below, rec);
  rec.line('A', 'section', 't (w_1 + w_2)', area, 'mm²', clause);
  rec.line('L_1', 'middle of the width to the face', '', middle, 'mm', '');
  rec.line('L_2', 'upper end to the face', '', upper, 'mm', '');
  rec.line('L_3', 'lower end to the face', '', lower, 'mm', '');
  rec.line('L_m', 'mean', '(L_1 + L_2 + L_3)/3', (middle + upper + lower) / 3, 'mm', '');
  rec.line('K L/r', 'r = t/√12', 'K L_m √12/t', slenderness, '', clause);
}

function recordWidth(above: number, below: number, rec: NonNullable<Rec>): void {
  const meaning = 'spread at 30°, cut by the outline and the face';
  rec.line('w_1', `${meaning}, above the axis`, '(n − 1) p tan 30° + g/2', above, 'mm', '');
  rec.line('w_2', `${meaning}, below the axis`, '(n − 1) p tan 30° + g/2', below, 'mm', '');
}
