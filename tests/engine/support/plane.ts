import type { Point } from '@shared/engine/index.ts';

/** Plane geometry written apart from the engine's, in x and y and by segments, to check it against. */

/** Distance from a point in a direction (radians) to a closed outline, mm. */
export function ray(outline: readonly Point[], from: Point, direction: number): number {
  const dx = Math.cos(direction);
  const dy = Math.sin(direction);
  let least = Infinity;
  outline.forEach((a, index) => {
    const b = outline[(index + 1) % outline.length] ?? a;
    const ex = b.x - a.x;
    const ey = b.y - a.y;
    const cross = dx * ey - dy * ex;
    if (Math.abs(cross) < 1e-12) return;
    const along = ((a.x - from.x) * ey - (a.y - from.y) * ex) / cross;
    const onEdge = ((a.x - from.x) * dy - (a.y - from.y) * dx) / cross;
    if (along >= 0 && onEdge >= -1e-9 && onEdge <= 1 + 1e-9) least = Math.min(least, along);
  });
  return least;
}

/** Distance from a point to a segment, mm. */
export function toSegment(point: Point, a: Point, b: Point): number {
  const ex = b.x - a.x;
  const ey = b.y - a.y;
  const part = Math.max(0, Math.min(1, ((point.x - a.x) * ex + (point.y - a.y) * ey) / (ex * ex + ey * ey)));
  return Math.hypot(point.x - a.x - part * ex, point.y - a.y - part * ey);
}
