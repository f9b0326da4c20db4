import type { Basis, BlockPull, Rec } from '../standards/basis.ts';
import { byBoth } from './resultant.ts';
import { groupHeight, groupWidth, type PlyEdges, type UprightGroup } from './upright-group.ts';

/** A ply that holds an upright group: thickness and hole as deducted, mm; strengths, MPa. */
export interface UprightPly {
  readonly thickness: number;
  readonly deduction: number;
  readonly fy: number;
  readonly fu: number;
}

/** One block: lengths of its planes and the holes that they lose. */
interface Block {
  readonly name: string;
  readonly shear: number;
  readonly shearHoles: number;
  readonly tension: number;
  readonly tensionHoles: number;
  readonly pull: BlockPull;
}

/** How the block at the end of a web or a plate is pulled: unevenly, as at a coped beam end, or evenly. */
export function endPull(group: UprightGroup, eccentric: boolean): BlockPull {
  if (!eccentric) return 'even';
  return group.columns === 1 ? 'coped-one-line' : 'coped-two-lines';
}

/**
 * Block shear along the face, N: the corner between the bolts and the two free edges, torn up or down. The shear
 * plane runs along the column farthest from the free side to the edge ahead, the tension plane from that column to
 * the free side at the last row.
 * @param ahead from the outer row to the edge ahead, mm
 * @param side from the outer column to the free side, mm
 * @param pull how the tension plane is pulled
 */
export function blockAlong(
  basis: Basis,
  ply: UprightPly,
  group: UprightGroup,
  ahead: number,
  side: number,
  pull: BlockPull,
  rec: Rec,
): number {
  const { rows, columns } = group;
  const corner = strengthOf(
    basis,
    ply,
    {
      name: 'shear along the column, tension to the free side',
      shear: groupHeight(group) + ahead,
      shearHoles: rows - 0.5,
      tension: groupWidth(group) + side,
      tensionHoles: columns - 0.5,
      pull,
    },
    rec,
  );
  const tornOut = 2 * columns * (groupHeight(group) + ahead) * ply.thickness;
  return Math.min(corner, basis.tearOut(tornOut, ply.fy, ply.fu, rec));
}

/**
 * Block shear across the face, N: blocks torn towards the free side by a pull. Shear planes run level from the
 * farthest column to the free side; the tension plane stands in that column, between the outer rows, or on to a free
 * edge above or below where there is one.
 * @param side from the outer column to the free side, mm
 * @param edges `above` and `below`: Infinity where no free edge is there
 */
export function blockAcross(
  basis: Basis,
  ply: UprightPly,
  group: UprightGroup,
  side: number,
  edges: Pick<PlyEdges, 'above' | 'below'>,
  rec: Rec,
): number {
  const length = groupWidth(group) + side;
  let least = basis.tearOut(2 * group.rows * length * ply.thickness, ply.fy, ply.fu, rec);
  for (const block of blocksAcross(group, length, edges)) {
    least = Math.min(least, strengthOf(basis, ply, block, rec));
  }
  return least;
}

/** Blocks torn along and across the face at once, as the root of the sum of squares, N: the project's method. */
export function blocksTogether(along: number, across: number, cos: number, sin: number, rec: Rec): number {
  if (rec !== null) {
    const method = 'method of this catalogue';
    rec.line('R_V', 'block torn along the face', 'the least', along, 'N', '');
    // A single row between no free edges has no block in bases without a tear-out of their own.
    if (across < Infinity) rec.line('R_N', 'block torn across the face', 'the least', across, 'N', '');
    else rec.line('R_N', 'block torn across the face', '', 'there is none', '', '');
    rec.line('', 'together', '√((V/R_V)² + (N/R_N)²) ≤ 1', 'as the root of the sum of squares', '', method);
  }
  return byBoth(along, across, cos, sin);
}

function blocksAcross(
  group: UprightGroup,
  length: number,
  { above, below }: Pick<PlyEdges, 'above' | 'below'>,
): Block[] {
  const height = groupHeight(group);
  const { rows, columns } = group;
  const plane = columns - 0.5;
  const towards = (name: string, edge: number): Block => ({
    name,
    shear: length,
    shearHoles: plane,
    tension: height + edge,
    tensionHoles: rows - 0.5,
    pull: 'uneven',
  });
  const two = { shear: 2 * length, shearHoles: 2 * plane, pull: 'even' as const };
  const blocks: Block[] = [];
  if (rows > 1) {
    const name = 'two shear planes, tension between the outer rows';
    blocks.push({ ...two, name, tension: height, tensionHoles: rows - 1 });
  }
  if (above < Infinity) blocks.push(towards('one shear plane, tension to the upper edge', above));
  if (below < Infinity) blocks.push(towards('one shear plane, tension to the lower edge', below));
  if (rows === 2 && above < Infinity && below < Infinity) {
    blocks.push({
      ...two,
      name: 'two shear planes, both outer strips',
      tension: above + below,
      tensionHoles: 1,
    });
  }
  return blocks;
}

function strengthOf(basis: Basis, ply: UprightPly, block: Block, rec: Rec): number {
  const { thickness, deduction, fy, fu } = ply;
  const ant = thickness * Math.max(0, block.tension - block.tensionHoles * deduction);
  const agv = thickness * block.shear;
  const anv = thickness * Math.max(0, block.shear - block.shearHoles * deduction);
  if (rec !== null) {
    const clause = basis.clauses.blockShear;
    rec.line('', block.name, '', '', '', '');
    rec.line('A_nt', 'net area in tension', 't (length − holes)', ant, 'mm²', clause);
    rec.line('A_gv', 'gross area in shear', 't × length', agv, 'mm²', clause);
    rec.line('A_nv', 'net area in shear', 't (length − holes)', anv, 'mm²', clause);
  }
  return basis.blockShear(ant, agv, anv, fy, fu, block.pull, rec);
}
