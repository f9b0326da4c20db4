import type { GussetModel } from './model.ts';

/** Edges of the plate, in the order of the outline. */
export const FACE = 0;
export const LOWER = 1;
export const END = 2;
export const UPPER = 3;

/** An edge that leans less than this runs along the ray and is not met by it. */
const LEVEL = 1e-12;

/**
 * The plate as one load angle sees it. Positions are s along the line of the brace from where it meets the
 * face, and q across it, so the bolts never move and the edges turn instead. Each edge is a half-plane:
 * `normalS s + normalQ q + distance` is how far a point lies inside it, mm. The outline is convex wherever the
 * rules permit it. One instance is turned from angle to angle, so that a sweep allocates nothing.
 */
export class GussetView {
  readonly normalS = new Float64Array(4);
  readonly normalQ = new Float64Array(4);
  readonly distance = new Float64Array(4);
  cos = NaN;
  sin = NaN;
  tension = true;
  /** From the first row along each line of bolts to the outline: the lower line, the upper line. */
  shearLower = NaN;
  shearUpper = NaN;
  /** From each outer line across the brace to the outline or the face, at the first row. */
  sideLower = NaN;
  sideUpper = NaN;
  /** From the axis across the brace to the outline or the face, at the first row. */
  below = NaN;
  above = NaN;
  /** From the last row along the brace to the outline, the least over its lines. */
  end = NaN;

  constructor(private readonly model: GussetModel) {}

  /** Turns the plate to a load angle in radians. */
  turn(theta: number, tension: boolean): void {
    this.cos = Math.cos(theta);
    this.sin = Math.sin(theta);
    this.tension = tension;
    this.set(FACE, this.cos, -this.sin, 0);
    if (this.model.tapered) this.setTapered();
    else this.setRectangular();
    this.measure();
  }

  /** Least distance inside an edge over the four corners of a group of bolts, mm. */
  leastInside(edge: number, from: number, to: number, halfWidth: number): number {
    const slope = this.normalS[edge]!;
    const ends = Math.min(slope * from, slope * to);
    return ends - Math.abs(this.normalQ[edge]!) * halfWidth + this.distance[edge]!;
  }

  /** From a point along the brace, towards the support, to the face, mm; 0 behind the face. */
  toFace(s: number, q: number): number {
    return Math.max(0, s - (q * this.sin) / this.cos);
  }

  /** Casts every ray that the limit states and rules ask for, edge by edge. */
  private measure(): void {
    const { firstRow, lastRow, halfGauge } = this.model;
    this.shearLower = this.shearUpper = this.end = Infinity;
    this.sideLower = this.sideUpper = this.below = this.above = Infinity;
    for (let edge = FACE; edge <= UPPER; edge++) {
      const normalS = this.normalS[edge]!;
      const normalQ = this.normalQ[edge]!;
      const middle = normalS * firstRow + this.distance[edge]!;
      const shift = normalQ * halfGauge;
      if (normalS < -LEVEL) {
        const perInside = -1 / normalS;
        const last = normalS * lastRow + this.distance[edge]! - Math.abs(shift);
        this.shearLower = Math.min(this.shearLower, (middle - shift) * perInside);
        this.shearUpper = Math.min(this.shearUpper, (middle + shift) * perInside);
        this.end = Math.min(this.end, last * perInside);
      }
      if (normalQ < -LEVEL) {
        const perInside = -1 / normalQ;
        this.sideUpper = Math.min(this.sideUpper, (middle + shift) * perInside);
        this.above = Math.min(this.above, middle * perInside);
      } else if (normalQ > LEVEL) {
        const perInside = 1 / normalQ;
        this.sideLower = Math.min(this.sideLower, (middle - shift) * perInside);
        this.below = Math.min(this.below, middle * perInside);
      }
    }
  }

  private setRectangular(): void {
    const { offset, halfHeight, projection } = this.model;
    this.set(LOWER, this.sin, this.cos, halfHeight + offset);
    this.set(END, -this.cos, this.sin, projection);
    this.set(UPPER, -this.sin, -this.cos, halfHeight - offset);
  }

  private setTapered(): void {
    const { offset, halfHeight, cutDistance, cutHalfWidth } = this.model;
    const below = -halfHeight - offset;
    const above = halfHeight - offset;
    this.set(END, -1, 0, cutDistance);
    this.setSide(LOWER, below * this.sin, below * this.cos, cutDistance, -cutHalfWidth);
    this.setSide(UPPER, cutDistance, cutHalfWidth, above * this.sin, above * this.cos);
  }

  /** The edge from one point to the next, the plate on its left. */
  private setSide(edge: number, s1: number, q1: number, s2: number, q2: number): void {
    const ds = s2 - s1;
    const dq = q2 - q1;
    const length = Math.sqrt(ds * ds + dq * dq);
    const normalS = -dq / length;
    const normalQ = ds / length;
    this.set(edge, normalS, normalQ, -(normalS * s1 + normalQ * q1));
  }

  private set(edge: number, normalS: number, normalQ: number, distance: number): void {
    this.normalS[edge] = normalS;
    this.normalQ[edge] = normalQ;
    this.distance[edge] = distance;
  }
}
