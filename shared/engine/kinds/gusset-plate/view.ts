import type { GussetModel } from './model.ts';

/** Edges of the plate, in the order of the outline. */
export const FACE = 0;
export const LOWER = 1;
export const END = 2;
export const UPPER = 3;

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

  constructor(private readonly model: GussetModel) {}

  /** Turns the plate to a load angle in radians. */
  turn(theta: number, tension: boolean): void {
    this.cos = Math.cos(theta);
    this.sin = Math.sin(theta);
    this.tension = tension;
    this.set(FACE, this.cos, -this.sin, 0);
    if (this.model.tapered) this.setTapered();
    else this.setRectangular();
  }

  /** How far inside an edge a point lies, mm. */
  inside(edge: number, s: number, q: number): number {
    return this.normalS[edge]! * s + this.normalQ[edge]! * q + this.distance[edge]!;
  }

  /** From a point along the brace, away from the support, to the outline, mm. */
  along(s: number, q: number): number {
    let least = Infinity;
    for (let edge = FACE; edge <= UPPER; edge++) {
      const slope = -this.normalS[edge]!;
      if (slope > 1e-12) least = Math.min(least, this.inside(edge, s, q) / slope);
    }
    return Math.max(0, least);
  }

  /** From a point across the brace to the outline or the face, mm. `side` +1 upwards, -1 downwards. */
  across(s: number, q: number, side: number): number {
    let least = Infinity;
    for (let edge = FACE; edge <= UPPER; edge++) {
      const slope = -side * this.normalQ[edge]!;
      if (slope > 1e-12) least = Math.min(least, this.inside(edge, s, q) / slope);
    }
    return Math.max(0, least);
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
