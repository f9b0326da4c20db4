/** The sweep's door: from a definition to packed results. */
export { RULE_CODE, ruleLegend, sweepChunk, type SweptChunk } from './chunk.ts';
export { bandCapacity, type BandOutcome } from './band.ts';
export { capacityCurve, type CapacityCurve } from './curve.ts';
export { anglesOf, expandGrid, ordinalOf, valuesOf, variantValues } from './grid.ts';
export { countOfRange, valuesOfRange } from './range.ts';
export { roundDown, unpackCapacity } from './rounding.ts';
export type * from './types.ts';
