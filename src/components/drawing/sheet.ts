import type { DetailGeometry, Point } from '@shared/engine/types.ts';

/** A dimension as it is drawn: two witness lines, the line with its end strokes, and the text along it. */
export interface DrawnDimension {
  readonly witness: readonly [Point, Point][];
  readonly line: readonly [Point, Point];
  readonly text: string;
  readonly at: Point;
  /** Degrees, in the drawing's upward sense, so that it reads from below or from the right. */
  readonly turn: number;
}

/** The part of the plane that the drawing shows, mm. */
export interface Extent {
  readonly left: number;
  readonly bottom: number;
  readonly width: number;
  readonly height: number;
}

const shift = ({ x, y }: Point, dx: number, dy: number): Point => ({ x: x + dx, y: y + dy });

/** Lays a dimension beside what it measures, at its signed offset. */
export function drawnDimension({
  from,
  to,
  text,
  offset,
}: DetailGeometry['dimensions'][number]): DrawnDimension {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const along = { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
  const normal = { x: -along.y, y: along.x };
  const ends: [Point, Point] = [
    shift(from, normal.x * offset, normal.y * offset),
    shift(to, normal.x * offset, normal.y * offset),
  ];
  const turn = (Math.atan2(along.y, along.x) * 180) / Math.PI;
  const upright = turn > 90 + 1e-6 || turn <= -90 + 1e-6 ? turn - 180 * Math.sign(turn) : turn;
  return {
    witness: [
      [from, ends[0]],
      [to, ends[1]],
    ],
    line: ends,
    text,
    at: { x: (ends[0].x + ends[1].x) / 2, y: (ends[0].y + ends[1].y) / 2 },
    turn: upright,
  };
}

/** Everything drawn, with a margin of a share of the larger side. */
export function extentOf(geometry: DetailGeometry, dimensions: readonly DrawnDimension[]): Extent {
  const points = [
    ...geometry.outline,
    ...geometry.member.flatMap(({ outline }) => outline),
    ...geometry.welds.flatMap(({ from, to }) => [from, to]),
    ...dimensions.flatMap(({ line }) => line),
    geometry.axis.from,
    geometry.axis.to,
  ];
  const xs = points.map(({ x }) => x);
  const ys = points.map(({ y }) => y);
  const [left, right] = [Math.min(0, ...xs), Math.max(0, ...xs)];
  const [bottom, top] = [Math.min(...ys), Math.max(...ys)];
  const margin = 0.08 * Math.max(right - left, top - bottom, 1);
  return {
    left: left - margin,
    bottom: bottom - margin,
    width: right - left + 2 * margin,
    height: top - bottom + 2 * margin,
  };
}
