import type { Me } from '@shared/contracts/auth.ts';
import type { Family, RevisionSummary } from '@shared/contracts/families.ts';
import { describe, expect, it } from 'vitest';
import { recentlyPublished, workLists } from '../../src/components/home/work-lists.ts';

const nobody = {
  defineFamilies: false,
  seeDrafts: false,
  exportTables: false,
  managePeople: false,
  readAudit: false,
};
const person = (id: number, role: Me['role'], can: Partial<Me['can']>): Me => ({
  id,
  name: `Person ${id}`,
  email: 'p@harrowquay.example',
  role,
  can: { ...nobody, ...can },
});
const manager = person(1, 'standards-manager', { defineFamilies: true, seeDrafts: true });
const admin = person(4, 'admin', { managePeople: true, seeDrafts: true });
const engineer = person(2, 'engineer', { exportTables: true });

const revision = (
  id: number,
  state: RevisionSummary['state'],
  author = 1,
  publishedAt: string | null = null,
) => ({
  id,
  letter: publishedAt ? 'A' : null,
  state,
  basis: 'en-1993-1-8-2005',
  variants: null,
  cells: null,
  shortHash: null,
  author: { id: author, name: `Person ${author}` },
  updatedAt: `2026-11-${10 + id}T10:00:00Z`,
  publishedAt,
});
const family = (id: number, ...revisions: RevisionSummary[]): Family => ({
  id,
  code: `GP-0${id}`,
  title: `Family ${id}`,
  kind: 'gusset-plate',
  lockVersion: 1,
  current: null,
  working: null,
  revisions,
  can: { edit: true, startRevision: false },
});
const families = [
  family(1, revision(1, 'published', 1, '2026-11-20T10:00:00Z'), revision(2, 'draft')),
  family(2, revision(3, 'in-check', 1)),
  family(3, revision(4, 'in-check', 9)),
  family(4, revision(5, 'checked')),
  family(5, revision(6, 'locked', 1, '2026-11-22T10:00:00Z'), revision(7, 'swept')),
];
const listed = (me: Me, of: readonly Family[] = families) =>
  Object.fromEntries(workLists(of, me).map(({ id, items }) => [id, items.map((item) => item.revision.id)]));

describe('what waits for a person', () => {
  it('is drafts, checks and publications for who defines families; the newest draft first within a family', () => {
    expect(listed(manager)).toEqual({ drafts: [2, 7], check: [4, 3], publication: [5] });
  });

  it('says of an own revision in check that another person signs', () => {
    const check = workLists(families, manager).find(({ id }) => id === 'check');
    expect(check?.items.map(({ remark }) => remark)).toEqual([undefined, 'Yours: another person signs']);
  });

  it('is locks for the administrator: published ones alone', () => {
    expect(listed(admin)).toEqual({ lock: [1] });
  });

  it('is checks for an engineer, and nothing for who is sent none', () => {
    expect(listed(engineer)).toEqual({ check: [3, 4] });
    expect(listed(engineer, [family(1, revision(1, 'published', 1, '2026-11-20T10:00:00Z'))])).toEqual({});
  });

  it('has the newest publication first', () => {
    expect(recentlyPublished(families).map((item) => item.revision.id)).toEqual([6, 1]);
  });
});
