import type { Basis, BearingStrength, Rec } from '../standards/basis.ts';
import type { PlyEdges, UprightGroup } from './upright-group.ts';

const METHOD = 'method of this catalogue';

/**
 * Bearing of each bolt of an upright group on one ply: the project's method. A bolt's force is resolved along the
 * edges, `sqrt((F_x/R_bx)^2 + (F_y/R_by)^2) <= 1`; each R_b takes the end on the side that the bolt pushes to and the
 * edges of the other direction. Every strength is worked out beforehand, because no load angle changes it.
 */
export class GroupBearing {
  /** Strength of each bolt, N, pushed away from the support, towards it, up and down. */
  readonly away: Float64Array;
  readonly towards: Float64Array;
  readonly up: Float64Array;
  readonly down: Float64Array;
  /** One over each strength, for the sweep; a strength of 0 leaves nothing to any force. */
  private readonly perAway: Float64Array;
  private readonly perTowards: Float64Array;
  private readonly perUp: Float64Array;
  private readonly perDown: Float64Array;
  /** The least of the group in each direction is used throughout. */
  readonly leastThroughout: boolean;

  /**
   * @param level, upright strengths across the face and along it, which differ where a basis limits one row
   * @param boltShear shear of one bolt, all planes, N: some bases compare it with the bearing of the group
   * @param leastChosen the family takes the least of the group throughout, as handbooks do (errs low)
   */
  constructor(
    private readonly basis: Basis,
    private readonly level: BearingStrength,
    private readonly upright: BearingStrength,
    private readonly group: UprightGroup,
    private readonly edges: PlyEdges,
    private readonly boltShear: number,
    private readonly leastChosen: boolean,
  ) {
    const count = group.rows * group.columns;
    this.away = new Float64Array(count);
    this.towards = new Float64Array(count);
    this.up = new Float64Array(count);
    this.down = new Float64Array(count);
    for (let bolt = 0; bolt < count; bolt++) {
      const row = Math.floor(bolt / group.columns);
      const column = bolt % group.columns;
      this.away[bolt] = this.levelStrength(row, column, 1, null);
      this.towards[bolt] = this.levelStrength(row, column, -1, null);
      this.up[bolt] = this.uprightStrength(row, column, 1, null);
      this.down[bolt] = this.uprightStrength(row, column, -1, null);
    }
    const most = Math.max(
      greatest(this.away),
      greatest(this.towards),
      greatest(this.up),
      greatest(this.down),
    );
    this.leastThroughout = leastChosen || basis.leastBearingThroughout(most, boltShear);
    this.perAway = this.inverses(this.away);
    this.perTowards = this.inverses(this.towards);
    this.perUp = this.inverses(this.up);
    this.perDown = this.inverses(this.down);
  }

  /**
   * Largest resultant, N, at which no bolt bears more than it can.
   * @param fx, fy what each bolt puts on the ply for a resultant of 1 N, times `sign`, row by row from the lowest
   */
  capacity(fx: Float64Array, fy: Float64Array, sign: number, rec: Rec): number {
    let most = 0;
    let worst = 0;
    for (let bolt = 0; bolt < fx.length; bolt++) {
      const used = this.squared(bolt, sign * fx[bolt]!, sign * fy[bolt]!);
      if (used > most) {
        most = used;
        worst = bolt;
      }
    }
    const capacity = most > 0 ? 1 / Math.sqrt(most) : Infinity;
    if (rec !== null) this.record(worst, sign * fx[worst]!, sign * fy[worst]!, capacity, rec);
    return capacity;
  }

  private squared(bolt: number, x: number, y: number): number {
    const ux = x * (x > 0 ? this.perAway : this.perTowards)[bolt]!;
    const uy = y * (y > 0 ? this.perUp : this.perDown)[bolt]!;
    return ux * ux + uy * uy;
  }

  /** One over each strength; first the least is put in place of all where it is used throughout. */
  private inverses(strengths: Float64Array): Float64Array {
    if (this.leastThroughout) strengths.fill(least(strengths));
    const inverses = new Float64Array(strengths.length);
    for (let bolt = 0; bolt < strengths.length; bolt++) inverses[bolt] = inverse(strengths[bolt]!);
    return inverses;
  }

  private levelStrength(row: number, column: number, sign: number, rec: Rec): number {
    const { columns, rows, gauge, pitch } = this.group;
    const outermost = sign > 0 ? column === columns - 1 : column === 0;
    const end = outermost ? (sign > 0 ? this.edges.far : this.edges.near) : Infinity;
    const below = this.edges.below + row * pitch;
    const above = this.edges.above + (rows - 1 - row) * pitch;
    const beside = rows > 1 ? pitch : Infinity;
    return this.level.bolt(end, outermost ? Infinity : gauge, Math.min(below, above), beside, rec);
  }

  private uprightStrength(row: number, column: number, sign: number, rec: Rec): number {
    const { columns, rows, gauge, pitch } = this.group;
    const outermost = sign > 0 ? row === rows - 1 : row === 0;
    const end = outermost ? (sign > 0 ? this.edges.above : this.edges.below) : Infinity;
    const near = this.edges.near + column * gauge;
    const far = this.edges.far + (columns - 1 - column) * gauge;
    const beside = columns > 1 ? gauge : Infinity;
    return this.upright.bolt(end, outermost ? Infinity : pitch, Math.min(near, far), beside, rec);
  }

  private record(bolt: number, x: number, y: number, capacity: number, rec: NonNullable<Rec>): void {
    const { columns } = this.group;
    const row = Math.floor(bolt / columns);
    const column = bolt % columns;
    const clause = this.basis.clauses.bearing;
    rec.line('', 'method', '√((F_x/R_bx)² + (F_y/R_by)²) ≤ 1', 'resolved along the edges', '', METHOD);
    const place = `row ${row + 1} from below, column ${column + 1} from the support`;
    rec.line('', 'weakest bolt', '', place, '', '');
    rec.line('F_x', 'across the face, unit resultant', '', x, 'N per N', '');
    rec.line('F_y', 'along the face, unit resultant', '', y, 'N per N', '');
    if (x !== 0) {
      rec.line('', 'R_bx', '', x > 0 ? 'pushed away from the support' : 'pushed towards it', '', '');
      this.levelStrength(row, column, Math.sign(x), rec);
    }
    if (y !== 0) {
      rec.line('', 'R_by', '', y > 0 ? 'pushed up' : 'pushed down', '', '');
      this.uprightStrength(row, column, Math.sign(y), rec);
    }
    if (this.leastThroughout) this.recordLeast(bolt, x, y, clause, rec);
    rec.line('R_b', 'weakest bolt, by the resultant', '', capacity, 'N', METHOD);
  }

  private recordLeast(bolt: number, x: number, y: number, clause: string, rec: NonNullable<Rec>): void {
    const meaning = this.leastChosen
      ? 'the least of the group throughout, as the family chooses'
      : 'shear of a bolt below some bearing: the least of the group throughout';
    rec.line('', meaning, '', '', '', clause);
    if (!this.leastChosen) rec.line('F_v', 'shear of one bolt', '', this.boltShear, 'N', clause);
    const level = (x > 0 ? this.away : this.towards)[bolt]!;
    const upright = (y > 0 ? this.up : this.down)[bolt]!;
    if (x !== 0) rec.line('R_bx', 'least of the group', '', level, 'N', clause);
    if (y !== 0) rec.line('R_by', 'least of the group', '', upright, 'N', clause);
  }
}

/** Finite, so that no force at all stays none beside a strength of 0. */
function inverse(strength: number): number {
  return Math.min(1 / strength, 1e100);
}

function greatest(strengths: Float64Array): number {
  let most = 0;
  for (let bolt = 0; bolt < strengths.length; bolt++) most = Math.max(most, strengths[bolt]!);
  return most;
}

function least(strengths: Float64Array): number {
  let found = Infinity;
  for (let bolt = 0; bolt < strengths.length; bolt++) found = Math.min(found, strengths[bolt]!);
  return found;
}
