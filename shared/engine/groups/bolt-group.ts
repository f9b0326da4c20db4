import type { Point } from '../types.ts';

/** Bolts of one group, all alike, as their offsets from the group's centroid. Millimetres, mm2. */
export interface BoltGroup {
  readonly count: number;
  readonly centroid: Point;
  readonly dx: Float64Array;
  readonly dy: Float64Array;
  /** Σr² about the centroid, mm². */
  readonly polar: number;
  /** Distance of the farthest bolt from the centroid, mm. */
  readonly radius: number;
}

/** A group of bolts at the given points, mm. */
export function boltGroup(points: readonly Point[]): BoltGroup {
  const count = points.length;
  let sumX = 0;
  let sumY = 0;
  for (const { x, y } of points) {
    sumX += x;
    sumY += y;
  }
  const centroid = { x: sumX / count, y: sumY / count };
  const dx = Float64Array.from(points, ({ x }) => x - centroid.x);
  const dy = Float64Array.from(points, ({ y }) => y - centroid.y);
  let polar = 0;
  let radius = 0;
  for (let i = 0; i < count; i++) {
    const square = dx[i]! * dx[i]! + dy[i]! * dy[i]!;
    polar += square;
    radius = Math.max(radius, Math.sqrt(square));
  }
  return { count, centroid, dx, dy, polar, radius };
}

/** Points of `rows` by `lines` bolts about the origin: rows `pitch` apart along y, lines `gauge` apart along x. */
export function boltPattern(rows: number, lines: number, pitch: number, gauge: number): Point[] {
  const points: Point[] = [];
  for (let line = 0; line < lines; line++) {
    for (let row = 0; row < rows; row++) {
      points.push({ x: (line - (lines - 1) / 2) * gauge, y: (row - (rows - 1) / 2) * pitch });
    }
  }
  return points;
}
