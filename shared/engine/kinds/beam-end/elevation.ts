import type { DetailGeometry, Point } from '../../types.ts';
import { type BeamEnd, type Cope, isCoped } from './beam.ts';

const box = (x0: number, x1: number, y0: number, y1: number): Point[] => [
  { x: x0, y: y0 },
  { x: x1, y: y0 },
  { x: x1, y: y1 },
  { x: x0, y: y1 },
];

/**
 * The beam's end beside the support, its copes cut out: web and flanges as outlines, x from the face of the support,
 * y from the middle of the bolts, drawn as far as `reach`, mm.
 */
export function elevationOf(beam: BeamEnd, reach: number): DetailGeometry['member'] {
  const { gap, section, top, bottom, offset } = beam;
  const upper = section.depth / 2 - offset;
  const lower = upper - section.depth;
  const inside = Math.max(reach, gap + Math.max(top.length, bottom.length) + section.flangeThickness);
  const start = (cope: Cope) => (isCoped(cope) ? gap + cope.length : gap);
  const outline = [
    { x: gap, y: lower + bottom.depth },
    ...(isCoped(bottom) ? [{ x: start(bottom), y: lower + bottom.depth }] : []),
    ...(isCoped(bottom) ? [{ x: start(bottom), y: lower }] : []),
    { x: inside, y: lower },
    { x: inside, y: upper },
    ...(isCoped(top) ? [{ x: start(top), y: upper }] : []),
    ...(isCoped(top) ? [{ x: start(top), y: upper - top.depth }] : []),
    { x: gap, y: upper - top.depth },
  ];
  const flange = section.flangeThickness;
  return [
    { outline, hidden: false },
    { outline: box(start(top), inside, upper - flange, upper), hidden: false },
    { outline: box(start(bottom), inside, lower, lower + flange), hidden: false },
  ];
}
