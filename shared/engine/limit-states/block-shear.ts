import type { Basis, BlockPull, Rec } from '../standards/basis.ts';

/**
 * A ply that a block can leave: thickness and hole as deducted, mm; strengths, MPa. In `kept` the blocks are
 * of an angle by one leg: they go to the toe only and always pull unevenly.
 */
export interface BlockPly {
  readonly thickness: number;
  readonly deduction: number;
  readonly fy: number;
  readonly fu: number;
  readonly rows: number;
  readonly lines: number;
  readonly gauge: number;
  readonly angle: boolean;
}

/**
 * The lowest of the blocks that a bolt group can tear out, N. mm:
 * @param shear1, shear2 length of the shear plane along each line, from the last row to the free end
 * @param side1, side2 from each outer line to the edge beside it, at the row the block starts from
 *   (one line of bolts: both are its own sides; an angle: `side2` to the toe, `side1` unused)
 */
export function blockCapacity(
  basis: Basis,
  ply: BlockPly,
  shear1: number,
  shear2: number,
  side1: number,
  side2: number,
  rec: Rec,
): number {
  const tornOut = 2 * ply.lines * Math.min(shear1, shear2) * ply.thickness;
  const least = leastBlock(basis, ply, shear1, shear2, side1, side2, rec);
  return Math.min(least, basis.tearOut(tornOut, ply.fy, ply.fu, rec));
}

/** The lowest of the blocks that keep a tension plane, N. */
function leastBlock(
  basis: Basis,
  ply: BlockPly,
  shear1: number,
  shear2: number,
  side1: number,
  side2: number,
  rec: Rec,
): number {
  const { gauge, angle } = ply;
  if (ply.lines === 1) {
    const second = block(
      basis,
      ply,
      'one shear plane, to the upper edge',
      1,
      shear1,
      side2,
      0.5,
      'uneven',
      rec,
    );
    if (angle) return second;
    return Math.min(
      second,
      block(basis, ply, 'one shear plane, to the lower edge', 1, shear1, side1, 0.5, 'uneven', rec),
    );
  }
  const both = shear1 + shear2;
  let least = block(
    basis,
    ply,
    'two shear planes, tension between the lines',
    2,
    both,
    gauge,
    1,
    angle ? 'uneven' : 'even',
    rec,
  );
  const across = block(
    basis,
    ply,
    'shear on line 1, tension across line 2',
    1,
    shear1,
    gauge + side2,
    1.5,
    'uneven',
    rec,
  );
  least = Math.min(least, across);
  if (angle) return least;
  const back = block(
    basis,
    ply,
    'shear on line 2, tension across line 1',
    1,
    shear2,
    gauge + side1,
    1.5,
    'uneven',
    rec,
  );
  const strips = block(
    basis,
    ply,
    'two shear planes, both outer strips',
    2,
    both,
    side1 + side2,
    1,
    'even',
    rec,
  );
  return Math.min(least, back, strips);
}

function block(
  basis: Basis,
  ply: BlockPly,
  name: string,
  planes: number,
  shear: number,
  tension: number,
  tensionHoles: number,
  pull: BlockPull,
  rec: Rec,
): number {
  const { thickness, deduction, rows } = ply;
  const ant = thickness * Math.max(0, tension - tensionHoles * deduction);
  const agv = thickness * shear;
  const anv = thickness * Math.max(0, shear - planes * (rows - 0.5) * deduction);
  if (rec !== null) recordBlock(basis, name, ant, agv, anv, rec);
  return basis.blockShear(ant, agv, anv, ply.fy, ply.fu, pull, rec);
}

function recordBlock(
  basis: Basis,
  name: string,
  ant: number,
  agv: number,
  anv: number,
  rec: NonNullable<Rec>,
): void {
  const clause = basis.clauses.blockShear;
  rec.line('', name, '', '', '', '');
  rec.line('A_nt', 'net area in tension', 't (length − holes)', ant, 'mm²', clause);
  rec.line('A_gv', 'gross area in shear', 't × length', agv, 'mm²', clause);
  rec.line('A_nv', 'net area in shear', 't (length − (n − ½) holes)', anv, 'mm²', clause);
}
