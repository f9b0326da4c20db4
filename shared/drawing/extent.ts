import type { Point } from '../engine/types.ts';
import type { Extent, Primitive } from './primitives.ts';

/** Letters are about this much wide per height: enough to keep words inside the sheet. */
const LETTER_WIDTH = 0.62;

function pointsOf(primitive: Primitive): readonly Point[] {
  switch (primitive.shape) {
    case 'line':
      return [primitive.from, primitive.to];
    case 'ring':
      return primitive.points;
    case 'circle': {
      const { centre, radius } = primitive;
      return [
        { x: centre.x - radius, y: centre.y - radius },
        { x: centre.x + radius, y: centre.y + radius },
      ];
    }
    case 'text':
      return cornersOf(primitive);
  }
}

/** The corners of a line of text: its letters stand above the point that it is set at. */
function cornersOf({ at, text, height, turn, anchor }: Extract<Primitive, { shape: 'text' }>): Point[] {
  const width = LETTER_WIDTH * height * text.length;
  const start = anchor === 'start' ? 0 : anchor === 'middle' ? -width / 2 : -width;
  const angle = (turn * Math.PI) / 180;
  const place = (x: number, y: number) => ({
    x: at.x + x * Math.cos(angle) - y * Math.sin(angle),
    y: at.y + x * Math.sin(angle) + y * Math.cos(angle),
  });
  return [place(start, 0), place(start + width, 0), place(start, height), place(start + width, height)];
}

/** What the strokes cover, with a margin on all sides, mm. */
export function extentOf(primitives: readonly Primitive[], margin: number): Extent {
  let [left, right, bottom, top] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const primitive of primitives) {
    for (const { x, y } of pointsOf(primitive)) {
      left = Math.min(left, x);
      right = Math.max(right, x);
      bottom = Math.min(bottom, y);
      top = Math.max(top, y);
    }
  }
  if (left > right) return { left: 0, bottom: 0, width: 2 * margin, height: 2 * margin };
  return {
    left: left - margin,
    bottom: bottom - margin,
    width: right - left + 2 * margin,
    height: top - bottom + 2 * margin,
  };
}
