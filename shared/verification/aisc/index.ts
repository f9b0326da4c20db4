import type { Check, Disagreement } from '../check.ts';
import { exampleDisagreements, examples } from './examples.ts';
import { manualTables } from './manual-tables.ts';
import { prying } from './prying.ts';

/** ANSI/AISC 360-22, both formats, against published values. */
export const aiscChecks: readonly Check[] = [...manualTables, ...examples, ...prying];
export const aiscDisagreements: readonly Disagreement[] = exampleDisagreements;
