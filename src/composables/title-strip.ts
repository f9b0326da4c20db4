import type { Revision } from '@shared/contracts/revisions.ts';
import { STATE_WORDS } from '../components/common/words.ts';
import { basisShort } from './basis.ts';
import type { StripCell } from '../components/common/TitleStrip.vue';

/** "revision B", or "working revision", inside a sentence. */
export const revisionWords = (letter: string | null): string =>
  letter ? `revision ${letter}` : 'working revision';

/** The title strip of a revision: what it is, by what basis, who answers for it, and its hash. */
export function revisionStrip(
  revision: Pick<
    Revision,
    'family' | 'letter' | 'state' | 'definition' | 'checker' | 'publisher' | 'shortHash'
  >,
): StripCell[] {
  const people: StripCell[] = [
    ...(revision.checker ? [{ label: 'Checked by', value: revision.checker.name }] : []),
    ...(revision.publisher ? [{ label: 'Published by', value: revision.publisher.name }] : []),
  ];
  return [
    { label: 'Family', value: `${revision.family.code} ${revision.family.title}` },
    { label: 'Revision', value: revision.letter ?? 'none yet' },
    { label: 'State', value: STATE_WORDS[revision.state] },
    { label: 'Design basis', value: basisShort(revision.definition.basis) },
    ...people,
    { label: 'Hash', value: revision.shortHash ?? 'not published', mono: true },
  ];
}
