import { groupHeight, type UprightGroup } from './upright-group.ts';

/**
 * Force on each bolt of an upright group by the elastic vector method: the resultant shared equally, its moment about
 * the middle of the group in proportion to the distance from it. One instance is loaded again and again, so that a
 * sweep allocates nothing.
 */
export class UprightForces {
  /** What each bolt puts on the ply that the resultant acts on, N, row by row from the lowest. */
  readonly fx: Float64Array;
  readonly fy: Float64Array;
  /** The greatest force on a bolt, N. */
  most = NaN;
  /** Σr² about the middle, mm². */
  readonly polar: number;
  private readonly x: Float64Array;
  private readonly y: Float64Array;

  constructor(group: UprightGroup) {
    const { rows, columns, pitch, gauge } = group;
    const count = rows * columns;
    this.fx = new Float64Array(count);
    this.fy = new Float64Array(count);
    this.x = new Float64Array(count);
    this.y = new Float64Array(count);
    const middle = ((columns - 1) * gauge) / 2;
    const half = groupHeight(group) / 2;
    let polar = 0;
    for (let bolt = 0; bolt < count; bolt++) {
      const x = (bolt % columns) * gauge - middle;
      const y = Math.floor(bolt / columns) * pitch - half;
      this.x[bolt] = x;
      this.y[bolt] = y;
      polar += x * x + y * y;
    }
    this.polar = polar;
  }

  /** Loads the group with N and V, N, and a moment about its middle, anticlockwise, N mm. */
  load(n: number, v: number, moment: number): void {
    const { x, y, fx, fy } = this;
    const turn = moment === 0 ? 0 : moment / this.polar;
    const count = fx.length;
    let most = 0;
    for (let bolt = 0; bolt < count; bolt++) {
      const level = n / count - turn * y[bolt]!;
      const upright = v / count + turn * x[bolt]!;
      fx[bolt] = level;
      fy[bolt] = upright;
      most = Math.max(most, level * level + upright * upright);
    }
    this.most = Math.sqrt(most);
  }
}
