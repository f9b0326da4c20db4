import type { Basis, BearingStrength, Rec } from '../standards/basis.ts';

/**
 * Bearing of a bolt group on a ply whose edges lie along and across the force, N.
 *
 * The row ahead has the free end before it (Infinity: none), every other row has the next row before it.
 * @param end, pitch, edge, gauge mm; Infinity where there is none
 * @param boltShear shear resistance of one bolt, all planes, N: some bases compare it with the bearing
 * @param shares takes the strength of each bolt, row by row and line by line; `aheadRow` has the end before it
 */
export function alignedBearing(
  basis: Basis,
  ply: BearingStrength,
  rows: number,
  lines: number,
  end: number,
  pitch: number,
  edge: number,
  gauge: number,
  boltShear: number,
  rec: Rec,
  shares: Float64Array | null = null,
  aheadRow = 0,
): number {
  if (rec !== null) rec.line('', 'row ahead', '', `${lines} of ${rows * lines} bolts`, '', '');
  const ahead = ply.bolt(end, Infinity, edge, gauge, rec);
  let least = ahead;
  let most = ahead;
  let sum = lines * ahead;
  shares?.fill(ahead);
  if (rows > 1) {
    if (rec !== null)
      rec.line('', 'rows behind', '', `${(rows - 1) * lines} of ${rows * lines} bolts`, '', '');
    const behind = ply.bolt(Infinity, pitch, edge, gauge, rec);
    least = Math.min(least, behind);
    most = Math.max(most, behind);
    sum += (rows - 1) * lines * behind;
    if (shares !== null) {
      shares.fill(behind);
      shares.fill(ahead, aheadRow * lines, (aheadRow + 1) * lines);
    }
  }
  return basis.bearingGroup(rows * lines, least, most, sum, boltShear, rec);
}

/** Bolts in rows along the force and lines beside it, in a plate with upright and level edges. mm. */
export interface InclinedGroup {
  readonly rows: number;
  readonly lines: number;
  readonly pitch: number;
  readonly gauge: number;
  /** From the origin of the line of the force to the nearest row. */
  readonly firstRow: number;
  /** Height of that origin above the middle of the plate. */
  readonly offset: number;
  readonly projection: number;
  readonly halfHeight: number;
}

/**
 * Bearing of a bolt group on a plate whose edges are inclined to the force, N: the project's method.
 *
 * Each bolt's share is resolved along the edges, `sqrt((F_x/R_bx)^2 + (F_y/R_by)^2) <= 1`; each R_b takes the
 * end on the side pushed to and the edges of the other direction. The welded edge is no free end. Pitch ahead
 * and gauge enter both directions. With the force along an edge this is the plain rule.
 * @param sign +1 where the bolts push the plate away from the support, -1 towards it
 * @param shares takes the strength of each bolt, row by row and line by line
 */
export function inclinedBearing(
  basis: Basis,
  ply: BearingStrength,
  group: InclinedGroup,
  cos: number,
  sin: number,
  sign: number,
  boltShear: number,
  shares: Float64Array,
  rec: Rec,
): number {
  const { rows, lines } = group;
  let least = Infinity;
  let most = 0;
  let sum = 0;
  let weakest = 0;
  for (let bolt = 0; bolt < rows * lines; bolt++) {
    const strength = inclinedBolt(ply, group, bolt, cos, sin, sign, null);
    if (strength < least) {
      least = strength;
      weakest = bolt;
    }
    most = Math.max(most, strength);
    sum += strength;
    shares[bolt] = strength;
  }
  if (rec !== null) recordWeakest(ply, group, weakest, cos, sin, sign, least, rec);
  return basis.bearingGroup(rows * lines, least, most, sum, boltShear, rec);
}

function recordWeakest(
  ply: BearingStrength,
  group: InclinedGroup,
  weakest: number,
  cos: number,
  sin: number,
  sign: number,
  strength: number,
  rec: NonNullable<Rec>,
): void {
  const method = 'method of this catalogue';
  const { lines } = group;
  const place = `row ${Math.floor(weakest / lines) + 1}, line ${(weakest % lines) + 1}`;
  rec.line('', 'method', '√((F_x/R_bx)² + (F_y/R_by)²) ≤ 1', 'resolved along the edges', '', method);
  rec.line('', 'weakest bolt; R_bx first, then R_by', '', place, '', '');
  inclinedBolt(ply, group, weakest, cos, sin, sign, rec);
  rec.line('R_b,min', 'weakest bolt along the force', '', strength, 'N', method);
}

function inclinedBolt(
  ply: BearingStrength,
  group: InclinedGroup,
  bolt: number,
  cos: number,
  sin: number,
  sign: number,
  rec: Rec,
): number {
  const { rows, lines, halfHeight } = group;
  const row = Math.floor(bolt / lines);
  const line = bolt - row * lines;
  const s = group.firstRow + row * group.pitch;
  const q = lines === 1 ? 0 : (line - 0.5) * group.gauge;
  const x = s * cos - q * sin;
  const y = group.offset + s * sin + q * cos;
  const hasNext = sign > 0 ? row < rows - 1 : row > 0;
  const pitch = hasNext ? group.pitch : Infinity;
  const gauge = lines === 1 ? Infinity : group.gauge;
  const toFree = group.projection - x;
  const toTop = halfHeight - y;
  const toBottom = halfHeight + y;
  const rx = ply.bolt(sign > 0 ? toFree : Infinity, pitch, Math.min(toTop, toBottom), gauge, rec);
  const ry = ply.bolt(sign * sin > 0 ? toTop : toBottom, pitch, toFree, gauge, rec);
  const ux = cos / rx;
  const uy = sin / ry;
  return 1 / Math.sqrt(ux * ux + uy * uy);
}
