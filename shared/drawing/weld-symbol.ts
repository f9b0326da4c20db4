import type { DetailGeometry, Point } from '../engine/types.ts';
import { line, type Primitive, ring, shift, type WeldSymbols } from './primitives.ts';

type Weld = DetailGeometry['welds'][number];

const number = (value: number) => String(Math.round(value * 10) / 10);

/**
 * A fillet weld's symbol: the arrow to the weld, the reference line, a triangle on each side that is welded, the
 * leg before it and the length behind.
 *
 * ISO 2553:2019, system A: the leg has the letter z; a weld on the arrow side stands on the continuous line, with a
 * dashed line below that is left out where both sides are welded. AWS A2.4: the leg has no letter, and the arrow
 * side is below the line. Both draw the upright of the triangle at its left.
 * @param side +1: the symbol stands to the right of the weld, -1: to its left
 * @param unit mm of the detail per unit of the intended sheet
 */
export function drawWeldSymbol(
  weld: Weld,
  at: Point,
  side: 1 | -1,
  symbols: WeldSymbols,
  unit: number,
): Primitive[] {
  const iso = symbols === 'iso-2553';
  const knee = shift(at, side * 26 * unit, 30 * unit);
  const width = 74 * unit;
  const left = side > 0 ? knee.x : knee.x - width;
  const { y } = knee;
  const leg = `${iso ? 'z' : ''}${number(weld.leg)}`;
  const length = number(Math.hypot(weld.to.x - weld.from.x, weld.to.y - weld.from.y));
  const mark = left + 32 * unit;
  const words = (text: string, x: number, anchor: 'start' | 'end'): Primitive => ({
    shape: 'text',
    pen: 'symbol',
    at: { x, y: y + 3 * unit },
    text,
    height: 11 * unit,
    turn: 0,
    anchor,
  });
  return [
    line('symbol', at, knee),
    head(at, knee, unit),
    line('symbol', { x: left, y }, { x: left + width, y }),
    ...(weld.bothSides || iso ? [triangle(mark, y, 1, unit)] : []),
    ...(weld.bothSides || !iso ? [triangle(mark, y, -1, unit)] : []),
    ...(iso && !weld.bothSides ? dashes(left, width, y - 4 * unit, unit) : []),
    words(leg, mark - 4 * unit, 'end'),
    words(length, mark + 15 * unit, 'start'),
  ];
}

/** The arrow head that touches the weld. */
function head(at: Point, knee: Point, unit: number): Primitive {
  const length = Math.hypot(knee.x - at.x, knee.y - at.y) || 1;
  const along = { x: (knee.x - at.x) / length, y: (knee.y - at.y) / length };
  const foot = shift(at, along.x * 9 * unit, along.y * 9 * unit);
  const half = 2.8 * unit;
  return ring(
    'symbol',
    [at, shift(foot, -along.y * half, along.x * half), shift(foot, along.y * half, -along.x * half)],
    true,
  );
}

/** The fillet's triangle above (+1) or below (-1) the reference line. */
function triangle(x: number, y: number, up: 1 | -1, unit: number): Primitive {
  const size = 11 * unit;
  return ring('symbol', [
    { x, y },
    { x, y: y + up * size },
    { x: x + size, y },
  ]);
}

function dashes(left: number, width: number, y: number, unit: number): Primitive[] {
  const [dash, step] = [6 * unit, 9 * unit];
  const many = Math.floor((width - dash) / step) + 1;
  return Array.from({ length: many }, (_, at) =>
    line('symbol', { x: left + at * step, y }, { x: left + at * step + dash, y }),
  );
}
