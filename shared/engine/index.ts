/** The engine's public door: nothing else of this folder is imported from outside it, the sweep apart. */
export {
  catalogueNumbersOf,
  catalogueReader,
  type CatalogueNumber,
  type CatalogueReading,
} from './kinds/catalogue-numbers.ts';
export { findKind, kinds } from './kinds/registry.ts';
export { forms as numberForms, type NumberField } from './kinds/object-values.ts';
export { catalogueNames } from './kinds/validate.ts';
export { kilonewtons, toDegrees, toRadians } from './numeric/units.ts';
export { bases, findBasis } from './standards/registry.ts';
export * from './types.ts';
export { ENGINE_VERSION } from './version.ts';
