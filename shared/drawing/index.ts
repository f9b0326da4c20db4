/** The drawing's public door: a detail as strokes, for screen, paper and file alike. */
export { drawElevation, type ElevationOptions } from './elevation.ts';
export type { Drawing, Extent, Pen, Primitive, WeldSymbols } from './primitives.ts';
export { drawView } from './view.ts';
