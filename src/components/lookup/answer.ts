import type { LookupAnswer } from '@shared/contracts/lookup.ts';
import type { RevisionState } from '@shared/contracts/common.ts';
import { day, fixed } from '../../composables/format.ts';
import type { StripCell } from '../common/TitleStrip.vue';
import { STATE_WORDS } from '../common/words.ts';

const stateWord = (state: string) => STATE_WORDS[state as RevisionState] ?? state;

/** The title strip of an answer: which revision of which family says it. */
export const answerStrip = ({ family, revision, basis }: LookupAnswer): StripCell[] => [
  { label: 'Family', value: `${family.code} ${family.title}` },
  { label: 'Revision', value: revision.letter },
  { label: 'State', value: stateWord(revision.state) },
  { label: 'Published', value: day(revision.publishedAt) },
  { label: 'Design basis', value: basis.title },
  { label: 'Engine', value: revision.engineVersion },
  { label: 'Hash', value: revision.shortHash, mono: true },
];

/** kN before rounding to the increment, cut to two decimals, never rounded up. */
export const printedUnrounded = (capacity: number): string =>
  fixed(Math.floor(capacity * 100 + 1e-9) / 100, 2);

/** Utilisation in per cent, rounded up so that 100.01 % is never shown as 100 %. */
export const percent = (utilisation: number): string =>
  `${fixed(Math.ceil(utilisation * 1000 - 1e-9) / 10, 1)} %`;

/** How much of the bar is filled, and where on it the capacity stands, both per cent of its width. */
export function barOf(utilisation: number): { filled: number; limit: number } {
  const whole = Math.max(1, utilisation);
  return { filled: (Math.min(utilisation, whole) / whole) * 100, limit: 100 / whole };
}
