import type { Me } from '@shared/contracts/auth.ts';
import type { RevisionState } from '@shared/contracts/common.ts';
import type { Family, RevisionSummary } from '@shared/contracts/families.ts';

export interface WorkItem {
  readonly family: Pick<Family, 'id' | 'code' | 'title'>;
  readonly revision: RevisionSummary;
  /** Why it stands in the list, when that is not plain. */
  readonly remark?: string;
}

export interface WorkList {
  readonly id: string;
  readonly title: string;
  /** Said when nothing is in it. */
  readonly none: string;
  readonly items: readonly WorkItem[];
}

const RECENT = 6;

function inState(families: readonly Family[], states: readonly RevisionState[]): WorkItem[] {
  return families.flatMap((family) =>
    family.revisions
      .filter(({ state }) => states.includes(state))
      .map((revision) => ({ family, revision }))
      .toSorted((one, other) => other.revision.updatedAt.localeCompare(one.revision.updatedAt)),
  );
}

function awaitingCheck(families: readonly Family[], me: Me): WorkList {
  const items = inState(families, ['in-check']).map((item) =>
    item.revision.author.id === me.id ? { ...item, remark: 'Yours: another person signs' } : item,
  );
  const own = ({ remark }: { remark?: string }) => Number(remark !== undefined);
  return {
    id: 'check',
    title: 'Waiting for a check',
    none: 'Nothing waits for a check.',
    items: items.toSorted((one, other) => own(one) - own(other)),
  };
}

/** What needs this person now, in the order of urgency; only what the person can act on or is waited for. */
export function workLists(families: readonly Family[], me: Me): WorkList[] {
  const lists: WorkList[] = [];
  if (me.can.defineFamilies)
    lists.push(
      {
        id: 'drafts',
        title: 'Drafts to finish',
        none: 'No draft is open.',
        items: inState(families, ['draft', 'swept']).map((item) =>
          item.revision.state === 'swept'
            ? { ...item, remark: 'Swept: look at the results, then submit' }
            : item,
        ),
      },
      awaitingCheck(families, me),
      {
        id: 'publication',
        title: 'Waiting for publication',
        none: 'Nothing is checked and unpublished.',
        items: inState(families, ['checked']),
      },
    );
  else if (me.can.managePeople)
    lists.push({
      id: 'lock',
      title: 'Waiting to be locked',
      none: 'Every published revision in force is locked.',
      items: inState(families, ['published']),
    });
  else {
    // Who may not see what is in check is sent none; an empty list would be noise to them.
    const check = awaitingCheck(families, me);
    if (check.items.length) lists.push(check);
  }
  return lists;
}

/** The last published revisions, newest first. */
export function recentlyPublished(families: readonly Family[]): WorkItem[] {
  return families
    .flatMap((family) => family.revisions.map((revision) => ({ family, revision })))
    .filter(({ revision }) => revision.publishedAt !== null)
    .toSorted((one, other) =>
      (other.revision.publishedAt ?? '').localeCompare(one.revision.publishedAt ?? ''),
    )
    .slice(0, RECENT);
}
