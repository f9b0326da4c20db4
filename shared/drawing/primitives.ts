import type { Point } from '../engine/types.ts';

/** What a line means; screen, paper and file each have their own weight and colour for it. */
export type Pen =
  | 'outline'
  | 'member'
  | 'hidden'
  | 'face'
  | 'hatch'
  | 'hole'
  | 'centre'
  | 'axis'
  | 'weld'
  | 'dimension'
  | 'symbol'
  | 'load';

/** One stroke of a drawing. Millimetres of the detail, y upwards. */
export type Primitive =
  | { readonly shape: 'line'; readonly pen: Pen; readonly from: Point; readonly to: Point }
  | { readonly shape: 'ring'; readonly pen: Pen; readonly points: readonly Point[]; readonly filled: boolean }
  | { readonly shape: 'circle'; readonly pen: Pen; readonly centre: Point; readonly radius: number }
  | {
      readonly shape: 'text';
      readonly pen: Pen;
      readonly at: Point;
      readonly text: string;
      /** Height of the letters, mm of the detail. */
      readonly height: number;
      /** Degrees, anticlockwise. */
      readonly turn: number;
      readonly anchor: 'start' | 'middle' | 'end';
    };

/** The part of the plane that a drawing covers, mm. */
export interface Extent {
  readonly left: number;
  readonly bottom: number;
  readonly width: number;
  readonly height: number;
}

/** A finished view: its strokes in drawing order and what they cover. */
export interface Drawing {
  readonly title: string;
  readonly primitives: readonly Primitive[];
  readonly extent: Extent;
}

/** Which standard the weld symbols follow. */
export type WeldSymbols = 'iso-2553' | 'aws-a2.4';

export const line = (pen: Pen, from: Point, to: Point): Primitive => ({ shape: 'line', pen, from, to });

export const ring = (pen: Pen, points: readonly Point[], filled = false): Primitive => ({
  shape: 'ring',
  pen,
  points,
  filled,
});

export const circle = (pen: Pen, centre: Point, radius: number): Primitive => ({
  shape: 'circle',
  pen,
  centre,
  radius,
});

/** A point moved by dx and dy, mm. */
export const shift = ({ x, y }: Point, dx: number, dy: number): Point => ({ x: x + dx, y: y + dy });
