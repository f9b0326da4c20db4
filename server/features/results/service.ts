/** What other features may ask of results. */
export { limitStatesOf, nameParameter, rulesOf } from './axes-service.ts';
export { anglesOfKind, storedCurve, type Envelope } from './curve-service.ts';
export { derivedParametersOf, fixedParametersOf } from './fixed-parameters.ts';
export { cautionsOf, notesOf } from './sheet-service.ts';
export { cellsOf, readCells, type StoredCells } from './stored-cells.ts';
export {
  expressionOf,
  outcomeWithout,
  placeOfSense,
  prepareVariant,
  sweptRevision,
  warningOf,
  withResults,
} from './swept-revision.ts';
export type { SweptRevision } from './swept-revision.ts';
export { sameValue, valueText } from './values.ts';
