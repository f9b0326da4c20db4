import type { Check, Disagreement } from '../check.ts';
import { holtzDisagreements, holtzExamples } from './holtz-examples.ts';
import { tensionByHand } from './tension.ts';

/** CSA S16:19 against published values. */
export const csaChecks: readonly Check[] = [...holtzExamples, ...tensionByHand];
export const csaDisagreements: readonly Disagreement[] = holtzDisagreements;
