import type { Point } from '../types.ts';

/** One straight fillet of a group, mm. A fillet on each side of a plate is two segments at one place. */
export interface WeldSegment {
  readonly from: Point;
  readonly to: Point;
}

/** Straight fillets of one leg, taken as lines. Millimetres, mm3. */
export interface WeldGroup {
  readonly segments: readonly WeldSegment[];
  readonly length: number;
  readonly centroid: Point;
  /** Line moments of inertia about axes along x and along y through the centroid, and their sum, mm3. */
  readonly ix: number;
  readonly iy: number;
  readonly ip: number;
  /** Distance of the farthest end from the centroid, mm. */
  readonly radius: number;
}

/** The group of the given segments; those without length are left out. */
export function weldGroup(all: readonly WeldSegment[]): WeldGroup {
  const segments = all.filter((segment) => lengthOf(segment) > 0);
  let length = 0;
  let sumX = 0;
  let sumY = 0;
  for (const segment of segments) {
    const own = lengthOf(segment);
    length += own;
    sumX += (own * (segment.from.x + segment.to.x)) / 2;
    sumY += (own * (segment.from.y + segment.to.y)) / 2;
  }
  const centroid = { x: sumX / length, y: sumY / length };
  let ix = 0;
  let iy = 0;
  let radius = 0;
  for (const segment of segments) {
    const own = lengthOf(segment);
    const { from, to } = segment;
    const rise = (from.y + to.y) / 2 - centroid.y;
    const run = (from.x + to.x) / 2 - centroid.x;
    ix += own * (rise * rise + (to.y - from.y) ** 2 / 12);
    iy += own * (run * run + (to.x - from.x) ** 2 / 12);
    for (const end of [from, to]) {
      radius = Math.max(radius, Math.hypot(end.x - centroid.x, end.y - centroid.y));
    }
  }
  return { segments, length, centroid, ix, iy, ip: ix + iy, radius };
}

export function lengthOf({ from, to }: WeldSegment): number {
  return Math.hypot(to.x - from.x, to.y - from.y);
}
