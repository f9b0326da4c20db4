import type { z } from 'zod';
import type { familyResponse } from '@shared/contracts/families.ts';
import type { App } from '../../context.ts';
import type { FamilyRow } from '../../database/models/family.ts';
import type { RevisionRow } from '../../database/models/revision.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { isCurrent, isIssued, maySee, peopleOf, presentSummary } from '../revisions/service.ts';

export type FamilyView = z.input<typeof familyResponse>;

/** Families as one person sees them; a family of which the person may see no revision is left out. */
export async function presentFamilies(
  app: App,
  person: SignedInPerson,
  families: readonly FamilyRow[],
  revisions: readonly RevisionRow[],
): Promise<FamilyView[]> {
  const names = await peopleOf(
    app,
    revisions.map(({ authorId }) => authorId),
  );
  const manager = person.role === 'standards-manager';
  return families.flatMap((family) => {
    const all = revisions.filter(({ familyId }) => familyId === family.id);
    const seen = all.filter(({ state }) => maySee(person.role, state));
    if (seen.length === 0) return [];
    const summaries = seen.map((row) => presentSummary(row, names));
    const { id, code, title, kind, lockVersion } = family;
    const working = summaries.find(({ state }) => !isIssued(state)) ?? null;
    return [
      {
        id,
        code,
        title,
        kind,
        lockVersion,
        current: summaries.find(({ state }) => isCurrent(state)) ?? null,
        working,
        revisions: summaries,
        can: { edit: manager, startRevision: manager && all.every(({ state }) => isIssued(state)) },
      },
    ];
  });
}
