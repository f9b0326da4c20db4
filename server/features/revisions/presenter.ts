import type { z } from 'zod';
import type { PersonRef } from '@shared/contracts/common.ts';
import type { revisionSummary } from '@shared/contracts/families.ts';
import type { revisionResponse } from '@shared/contracts/revisions.ts';
import type { App } from '../../context.ts';
import type { RevisionRow } from '../../database/models/revision.ts';
import { abilities } from './policy.ts';
import { definitionOf, type Related } from './read-service.ts';

type Names = ReadonlyMap<number, PersonRef>;

/** Names of the people who stand in some rows. */
export async function peopleOf(app: App, ids: readonly (number | null | undefined)[]): Promise<Names> {
  const wanted = [...new Set(ids.filter((id): id is number => typeof id === 'number'))];
  const rows = await app.db.models.Person.findAll({ where: { id: wanted }, attributes: ['id', 'name'] });
  return new Map(rows.map(({ id, name }) => [id, { id, name }]));
}

const known = (names: Names, id: number): PersonRef => names.get(id) ?? { id, name: 'unknown' };
const maybe = (names: Names, id: number | null): PersonRef | null => (id === null ? null : known(names, id));
const instant = (date: Date | null): string | null => date?.toISOString() ?? null;
const short = (hash: string | null): string | null => hash?.slice(0, 12) ?? null;

/** A revision in a list. */
export const presentSummary = (row: RevisionRow, names: Names): z.input<typeof revisionSummary> => ({
  id: row.id,
  letter: row.letter,
  state: row.state,
  basis: definitionOf(row).basis,
  variants: row.variantCount,
  cells: row.cellCount,
  shortHash: short(row.contentHash),
  author: known(names, row.authorId),
  updatedAt: row.updatedAt.toISOString(),
  publishedAt: instant(row.publishedAt),
});

/** A revision, whole, as one person sees it. */
export async function presentRevision(
  app: App,
  row: RevisionRow,
  { family, signatures, job, standing }: Related,
): Promise<z.input<typeof revisionResponse>> {
  const { authorId, checkerId, publisherId, lockerId } = row;
  const signers = signatures.map(({ personId }) => personId);
  const names = await peopleOf(app, [authorId, checkerId, publisherId, lockerId, ...signers]);
  return {
    id: row.id,
    family: { id: family.id, code: family.code, title: family.title, kind: family.kind },
    letter: row.letter,
    state: row.state,
    definition: definitionOf(row),
    definitionHash: row.definitionHash,
    engineVersion: row.engineVersion,
    contentHash: row.contentHash,
    shortHash: short(row.contentHash),
    variants: row.variantCount,
    cells: row.cellCount,
    rejectedCells: row.rejectedCells,
    lockVersion: row.lockVersion,
    author: known(names, authorId),
    checker: maybe(names, checkerId),
    publisher: maybe(names, publisherId),
    locker: maybe(names, lockerId),
    updatedAt: row.updatedAt.toISOString(),
    submittedAt: instant(row.submittedAt),
    checkedAt: instant(row.checkedAt),
    publishedAt: instant(row.publishedAt),
    lockedAt: instant(row.lockedAt),
    signatures: signatures.map(({ personId, verdict, comment, at }) => ({
      person: known(names, personId),
      verdict,
      comment,
      at: at.toISOString(),
    })),
    sweep: job ? { id: job.id, state: job.state } : null,
    withdrawnReason: row.withdrawnReason,
    can: abilities(standing),
  };
}
