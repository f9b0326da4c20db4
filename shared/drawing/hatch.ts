import type { Point } from '../engine/types.ts';
import { line, type Primitive } from './primitives.ts';

/** Lines at 45 degrees inside an outline, `step` mm apart along x: a cut part. */
export function hatchRing(outline: readonly Point[], step: number): Primitive[] {
  const places = outline.map(({ x, y }) => x - y);
  const lines: Primitive[] = [];
  const first = Math.ceil(Math.min(...places) / step) * step;
  for (let c = first; c < Math.max(...places); c += step) {
    const crossings = crossingsOf(outline, c);
    for (let at = 0; at + 1 < crossings.length; at += 2) {
      lines.push(line('hatch', crossings[at]!, crossings[at + 1]!));
    }
  }
  return lines;
}

/** Where the line x − y = c crosses the sides, from the left. */
function crossingsOf(outline: readonly Point[], c: number): Point[] {
  return outline
    .flatMap((from, at): Point[] => {
      const to = outline[(at + 1) % outline.length]!;
      const a = from.x - from.y - c;
      const b = to.x - to.y - c;
      // A corner on the line belongs to one of its two sides alone.
      if (a < 0 === b < 0) return [];
      const share = a / (a - b);
      return [{ x: from.x + share * (to.x - from.x), y: from.y + share * (to.y - from.y) }];
    })
    .sort((one, other) => one.x - other.x);
}
