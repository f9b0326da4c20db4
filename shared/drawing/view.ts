import type { DetailView, Point } from '../engine/types.ts';
import { drawDimension } from './dimension.ts';
import { unitFor } from './elevation.ts';
import { extentOf } from './extent.ts';
import { hatchRing } from './hatch.ts';
import { type Drawing, line, type Primitive, ring, shift } from './primitives.ts';

/** A section or plan of the detail: cut parts hatched, bolts by shank, head and nut, fillets filled. */
export function drawView(view: DetailView): Drawing {
  const bare = [
    ...view.parts.map(({ outline, hidden, cut }) =>
      ring(hidden ? 'hidden' : cut ? 'outline' : 'member', outline),
    ),
    ...view.fillets.map((points) => ring('weld', points, true)),
    ...view.bolts.flatMap(boltOf),
  ];
  const unit = unitFor([...bare, ...view.dimensions.flatMap((one) => drawDimension(one, 0))]);
  const cut = view.parts.filter((part) => part.cut);
  const drawn = [
    ...cut.flatMap(({ outline }) => hatchRing(outline, 7 * unit)),
    ...bare,
    ...view.dimensions.flatMap((one) => drawDimension(one, unit)),
  ];
  return { title: view.title, primitives: drawn, extent: extentOf(drawn, 10 * unit) };
}

/** Head 0.65 d and nut 0.8 d high over 1.6 d across, as bolts are drawn; not a dimension to work from. */
function boltOf({ from, to, diameter: d }: DetailView['bolts'][number]): Primitive[] {
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
