import { findBasis } from '@shared/engine/index.ts';

/** The short name of a design basis; the id of one that this page does not know. */
export const basisShort = (id: string): string => findBasis(id)?.short ?? id;
