import type { Check, Disagreement } from '../check.ts';
import { courseNoteDisagreements, courseNotes } from './course-notes.ts';
import { tensionByHand } from './tension.ts';

/** CSA S16:19 against published values. */
export const csaChecks: readonly Check[] = [...courseNotes, ...tensionByHand];
export const csaDisagreements: readonly Disagreement[] = courseNoteDisagreements;
