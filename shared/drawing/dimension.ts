import type { Dimension, Point } from '../engine/types.ts';
import { line, type Primitive, shift } from './primitives.ts';

/** Height of words on the intended sheet, in units of it. */
const WORDS = 11.5;
const STROKE = 4;

/**
 * A dimension beside what it measures, at its signed offset: witness lines, the line with oblique strokes at its
 * ends, and the text along it, to be read from below or from the right.
 * @param unit mm of the detail per unit of the intended sheet
 */
export function drawDimension({ from, to, text, offset }: Dimension, unit: number): Primitive[] {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const along = { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
  const start = shift(from, -along.y * offset, along.x * offset);
  const end = shift(to, -along.y * offset, along.x * offset);
  const turn = uprightTurn(along);
  const middle = { x: (start.x + end.x) / 2, y: (start.y + end.y) / 2 };
  const above = (turn * Math.PI) / 180;
  const lift = 3.5 * unit;
  return [
    line('dimension', from, start),
    line('dimension', to, end),
    line('dimension', start, end),
    strokeAt(start, unit),
    strokeAt(end, unit),
    {
      shape: 'text',
      pen: 'dimension',
      at: shift(middle, -Math.sin(above) * lift, Math.cos(above) * lift),
      text,
      height: WORDS * unit,
      turn,
      anchor: 'middle',
    },
  ];
}

/** Degrees of a direction, turned round where the words would stand on their head. */
function uprightTurn(along: Point): number {
  const turn = (Math.atan2(along.y, along.x) * 180) / Math.PI;
  return turn > 90 + 1e-6 || turn <= -90 + 1e-6 ? turn - 180 * Math.sign(turn) : turn;
}

/** The oblique stroke of building drawings. */
function strokeAt(at: Point, unit: number): Primitive {
  const half = STROKE * unit;
  return line('dimension', shift(at, -half, -half), shift(at, half, half));
}
