import type { Family } from '@shared/contracts/families.ts';
import { basisShort } from '../../composables/basis.ts';
import { STATE_WORDS } from '../common/words.ts';

export interface IssuedRevision {
  readonly id: number;
  readonly title: string;
  readonly subtitle: string;
  readonly inForce: boolean;
}

const IN_FORCE: readonly string[] = ['published', 'locked'];
const ISSUED: readonly string[] = [...IN_FORCE, 'superseded', 'withdrawn'];

/** Every published revision, those in force first. */
export function issuedRevisions(families: readonly Family[]): IssuedRevision[] {
  const all = families.flatMap((family) =>
    family.revisions
      .filter(({ state }) => ISSUED.includes(state))
      .map((revision) => ({
        id: revision.id,
        title: `${family.code} ${family.title}, revision ${revision.letter ?? ''}`,
        subtitle: `${STATE_WORDS[revision.state]} · ${basisShort(revision.basis)} · ${revision.shortHash ?? ''}`,
        inForce: IN_FORCE.includes(revision.state),
      })),
  );
  return all.toSorted((one, other) => Number(other.inForce) - Number(one.inForce));
}
