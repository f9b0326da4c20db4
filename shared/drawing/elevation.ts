import type { DetailGeometry, Point, Sense } from '../engine/types.ts';
import { boltOf, holeAt } from './bolt.ts';
import { drawDimension } from './dimension.ts';
import { extentOf } from './extent.ts';
import { type Drawing, line, type Primitive, ring, type WeldSymbols } from './primitives.ts';
import { drawWeldSymbol } from './weld-symbol.ts';

/** The sheet that a view is meant for, in units of it: lines of words keep their size at any scale. */
const SHEET = { width: 440, height: 330 };

export interface ElevationOptions {
  /** Load angle, degrees. */
  readonly angle: number;
  readonly sense: Sense;
  readonly weldSymbols: WeldSymbols;
}

/** A detail in the plane of its plate, the face of the support at the left, with dimensions, symbols and load. */
export function drawElevation(geometry: DetailGeometry, options: ElevationOptions): Drawing {
  const bare = partsOf(geometry);
  const unit = unitFor([...bare, ...geometry.dimensions.flatMap((one) => drawDimension(one, 0))]);
  const drawn = [
    ...bare,
    ...geometry.dimensions.flatMap((one) => drawDimension(one, unit)),
    ...symbolsOf(geometry, options.weldSymbols, unit),
    ...loadArrow(geometry.axis.to, options, unit),
  ];
  const extent = extentOf(drawn, 10 * unit);
  return {
    title: 'Elevation',
    primitives: [...faceOf(extent.bottom, extent.height, unit), ...drawn],
    extent,
  };
}

/** Millimetres of the detail per unit of the intended sheet. */
export function unitFor(primitives: readonly Primitive[]): number {
  const { width, height } = extentOf(primitives, 0);
  return 1.25 * Math.max(width / SHEET.width, height / SHEET.height, 0.05);
}

function partsOf(geometry: DetailGeometry): Primitive[] {
  return [
    ring('outline', geometry.outline, true),
    ...geometry.member.map(({ outline, hidden }) => ring(hidden ? 'hidden' : 'member', outline)),
    ...geometry.welds.map(({ from, to }) => line('weld', from, to)),
    line('axis', geometry.axis.from, geometry.axis.to),
    ...geometry.holes.flatMap(({ centre, diameter }) => holeAt(centre, diameter)),
    ...(geometry.bolts ?? []).flatMap(boltOf),
  ];
}

/** One symbol for each size of weld, at the upper end of its first line. */
function symbolsOf({ welds }: DetailGeometry, symbols: WeldSymbols, unit: number): Primitive[] {
  const firsts = welds.filter((weld, at) => welds.findIndex(({ leg }) => leg === weld.leg) === at);
  return firsts.flatMap((weld) => {
    const upper = weld.from.y > weld.to.y ? weld.from : weld.to;
    const lower = upper === weld.from ? weld.to : weld.from;
    const at = { x: upper.x + (lower.x - upper.x) * 0.12, y: upper.y + (lower.y - upper.y) * 0.12 };
    return drawWeldSymbol(weld, at, -1, symbols, unit);
  });
}

/** The arrow of the load at the end of the member: away from it in tension, into it in compression. */
function loadArrow(at: Point, { angle, sense }: ElevationOptions, unit: number): Primitive[] {
  const turn = ((sense === 'tension' ? angle : angle + 180) * Math.PI) / 180;
  const place = (along: number, across: number): Point => ({
    x: at.x + unit * (along * Math.cos(turn) - across * Math.sin(turn)),
    y: at.y + unit * (along * Math.sin(turn) + across * Math.cos(turn)),
  });
  return [
    line('load', place(-44, 0), place(2, 0)),
    ring('load', [place(-8, 6), place(6, 0), place(-8, -6)], true),
  ];
}

/** The face of the support over the height of the sheet, hatched on its far side. */
function faceOf(bottom: number, height: number, unit: number): Primitive[] {
  const step = 9 * unit;
  const hatches = Array.from({ length: Math.ceil(height / step) }, (_, at) => {
    const y = bottom + height - at * step;
    return line('hatch', { x: 0, y }, { x: -8 * unit, y: y - 8 * unit });
  });
  return [...hatches, line('face', { x: 0, y: bottom }, { x: 0, y: bottom + height })];
}
