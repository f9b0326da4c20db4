import type { DetailView, Point } from '../engine/types.ts';
import { circle, line, type Primitive, ring, shift } from './primitives.ts';

/** A bolt from the side: head 0.65 d and nut 0.8 d high over 1.6 d across, as bolts are drawn; not a dimension to work from. */
export function boltOf({ from, to, diameter: d }: DetailView['bolts'][number]): Primitive[] {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const along = { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
  const box = (start: Point, deep: number, wide: number): Primitive => {
    const end = shift(start, along.x * deep, along.y * deep);
    const [dx, dy] = [(-along.y * wide) / 2, (along.x * wide) / 2];
    return ring(
      'hole',
      [shift(start, dx, dy), shift(end, dx, dy), shift(end, -dx, -dy), shift(start, -dx, -dy)],
      true,
    );
  };
  const reach = 1.4 * d;
  return [
    box(from, length, d),
    box(from, -0.65 * d, 1.6 * d),
    box(to, 0.8 * d, 1.6 * d),
    line(
      'axis',
      shift(from, -along.x * reach, -along.y * reach),
      shift(to, along.x * reach, along.y * reach),
    ),
  ];
}

/** A hole on its face, to scale with its centre lines. */
export function holeAt(centre: Point, diameter: number): Primitive[] {
  const reach = diameter * 0.75;
  const { x, y } = centre;
  return [
    circle('hole', centre, diameter / 2),
    line('centre', { x: x - reach, y }, { x: x + reach, y }),
    line('centre', { x, y: y - reach }, { x, y: y + reach }),
  ];
}
