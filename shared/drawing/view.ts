import type { DetailView } from '../engine/types.ts';
import { boltOf, holeAt } from './bolt.ts';
import { drawDimension } from './dimension.ts';
import { unitFor } from './elevation.ts';
import { extentOf } from './extent.ts';
import { hatchRing } from './hatch.ts';
import { type Drawing, ring } from './primitives.ts';

/** A section or plan of the detail: cut parts hatched, bolts by shank, head and nut, fillets filled. */
export function drawView(view: DetailView): Drawing {
  const bare = [
    ...view.parts.map(({ outline, hidden, cut }) =>
      ring(hidden ? 'hidden' : cut ? 'outline' : 'member', outline),
    ),
    ...view.fillets.map((points) => ring('weld', points, true)),
    ...view.bolts.flatMap(boltOf),
    ...(view.holes ?? []).flatMap(({ centre, diameter }) => holeAt(centre, diameter)),
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
