/** Dash patterns, px: told apart without colour. A limit state keeps its own through every chart. */
const DASHES: readonly (readonly number[])[] = [
  [],
  [8, 4],
  [2, 3],
  [10, 3, 2, 3],
  [5, 2],
  [12, 5],
  [2, 2, 6, 2],
  [1, 4],
  [14, 3, 3, 3, 3, 3],
  [4, 6],
  [8, 2, 2, 2],
  [3, 3],
];

export const dashOf = (place: number): readonly number[] => DASHES[place % DASHES.length] ?? [];

/** A curve as the chart draws it. kN by degrees. */
export interface DrawnCurve {
  readonly angles: readonly number[];
  readonly capacity: readonly (number | null)[];
  readonly governing: readonly number[];
  readonly limitStates: readonly {
    readonly id: string;
    readonly code: string;
    readonly title: string;
    readonly part: string;
    readonly capacity: readonly (number | null)[];
  }[];
}

/** Limit states that have a capacity somewhere on the curve; the others do not apply to the sense. */
export const appearing = ({ limitStates }: DrawnCurve) =>
  limitStates.filter(({ capacity }) => capacity.some((value) => value !== null));

export interface Line {
  readonly name: string;
  readonly colour: string;
  readonly dash: readonly number[];
  readonly width: number;
  readonly points: readonly { readonly x: number; readonly y: number | null }[];
}

/**
 * The lines of the chart, the envelope last for a chart draws its last line first: beneath the others.
 */
export function linesOf(
  curve: DrawnCurve,
  colours: ReadonlyMap<string, { readonly fill: string }>,
  hidden: ReadonlySet<string>,
  ink: string,
): Line[] {
  const at = (values: readonly (number | null)[]) =>
    curve.angles.map((x, place) => ({ x, y: values[place] ?? null }));
  const states = appearing(curve)
    .filter(({ id }) => !hidden.has(id))
    .map(({ id, code, capacity }) => ({
      name: code,
      colour: colours.get(id)?.fill ?? ink,
      dash: dashOf(curve.limitStates.findIndex((one) => one.id === id)),
      width: 2,
      points: at(capacity),
    }));
  return [...states, { name: 'Capacity', colour: ink, dash: [], width: 5, points: at(curve.capacity) }];
}

/** The top of the chart, kN: room above the envelope's peak, with the limit states near it. */
export function topOf(curve: DrawnCurve): number {
  const peak = curve.capacity.reduce<number>((most, value) => Math.max(most, value ?? 0), 0);
  return peak > 0 ? Number((peak * 1.6).toPrecision(2)) : 1;
}
