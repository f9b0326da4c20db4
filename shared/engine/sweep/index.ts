/** The sweep's door: from a definition to packed results. */
export { sweepChunk, type SweptChunk } from './chunk.ts';
export { bandCapacity, type BandOutcome } from './band.ts';
export { capacityCurve, type CapacityCurve } from './curve.ts';
export {
  anglesOf,
  expandGrid,
  hasExpressions,
  isNumeric,
  ordinalOf,
  valuesOf,
  variantValues,
} from './grid.ts';
export { countOfRange, valuesOfRange } from './range.ts';
export { DERIVED_VALUE, familyRuleId, RULE_CODE, ruleLegend } from './rule-legend.ts';
export { roundDown, unpackCapacity } from './rounding.ts';
export type * from './types.ts';
export { prepareVariant, type VariantResult } from './variant.ts';
