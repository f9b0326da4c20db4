import { Op } from 'sequelize';
import type { App } from '../../context.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { changeRevision, type Held, type RevisionView } from './change-service.ts';
import { contentHashOf } from './content-service.ts';
import { letterAfter } from './policy.ts';

type Change = (app: App, person: SignedInPerson, id: number, version: number) => Promise<RevisionView>;

/** Hands a swept revision to the checkers. */
export const submitRevision =
  (comment: string): Change =>
  (app, person, id, version) =>
    changeRevision(app, person, id, version, 'submit', async (held) => {
      await addSignature(held, 'submitted', comment);
      const { row, transaction, now } = held;
      await row.update({ state: 'in-check', submittedAt: now }, { transaction });
      return { action: 'revision.submitted', detail: { comment } };
    });

/** A second person signs. */
export const signRevision =
  (comment: string): Change =>
  (app, person, id, version) =>
    changeRevision(app, person, id, version, 'sign', async (held) => {
      await addSignature(held, 'signed', comment);
      const { row, transaction, now } = held;
      await row.update({ state: 'checked', checkerId: person.id, checkedAt: now }, { transaction });
      return { action: 'revision.signed', detail: { comment } };
    });

/** The checker returns it: a draft again, and the sweep is thrown away. */
export const returnRevision =
  (comment: string): Change =>
  (app, person, id, version) =>
    changeRevision(app, person, id, version, 'return', async (held) => {
      await addSignature(held, 'returned', comment);
      await throwSweepAway(held);
      return { action: 'revision.returned', detail: { comment } };
    });

/** Gives the letter, freezes every cell under its hash, and supersedes the family's revision in force. */
export const publishRevision =
  (confirm: string): Change =>
  (app, person, id, version) =>
    changeRevision(app, person, id, version, 'publish', async (held) => {
      confirmCode(held, confirm);
      const { row, transaction, now } = held;
      // The family's row orders those who publish in it.
      await held.related.family.reload({ transaction, lock: transaction.LOCK.UPDATE });
      await refuseIncomplete(held);
      const { Revision } = app.db.models;
      const before = { familyId: row.familyId, letter: { [Op.ne]: null } };
      const letter = letterAfter(await Revision.count({ where: before, transaction }));
      const contentHash = await contentHashOf(app, row, transaction);
      const superseded = await supersede(held);
      const issued = {
        state: 'published',
        letter,
        contentHash,
        publisherId: person.id,
        publishedAt: now,
      } as const;
      await row.update(issued, { transaction });
      return { action: 'revision.published', detail: { letter, contentHash, superseded } };
    });

/** Final. */
export const lockRevision =
  (confirm: string): Change =>
  (app, person, id, version) =>
    changeRevision(app, person, id, version, 'lock', async (held) => {
      confirmCode(held, confirm);
      const { row, transaction, now } = held;
      if ((await contentHashOf(app, row, transaction)) !== row.contentHash) {
        problem('state-conflict', {
          detail:
            'Its cells are not those that were published. It is not locked; withdraw it and look at the audit trail.',
        });
      }
      await row.update({ state: 'locked', lockerId: person.id, lockedAt: now }, { transaction });
      return { action: 'revision.locked', detail: { contentHash: row.contentHash } };
    });

/** Takes a revision out of force. */
export const withdrawRevision =
  (reason: string): Change =>
  (app, person, id, version) =>
    changeRevision(app, person, id, version, 'withdraw', async ({ row, transaction }) => {
      await row.update({ state: 'withdrawn', withdrawnReason: reason }, { transaction });
      return { action: 'revision.withdrawn', detail: { reason } };
    });

/** Back to an unswept draft, without its cells. The state goes first: cells may leave a draft alone. */
export async function throwSweepAway({ app, row, transaction }: Pick<Held, 'app' | 'row' | 'transaction'>) {
  await row.update(
    {
      state: 'draft',
      engineVersion: null,
      variantCount: null,
      cellCount: null,
      rejectedCells: null,
      resultSummary: null,
      submittedAt: null,
    },
    { transaction },
  );
  await app.db.execute('DELETE FROM variants WHERE revision_id = :id', { id: row.id }, transaction);
}

async function addSignature(
  { app, row, person, transaction, now }: Held,
  verdict: 'submitted' | 'signed' | 'returned',
  comment: string,
) {
  const signature = { revisionId: row.id, personId: person.id, verdict, comment, at: now };
  await app.db.models.Signature.create(signature, { transaction });
}

function confirmCode({ related }: Held, confirm: string): void {
  const { code } = related.family;
  if (confirm === code) return;
  const message = `Type the code of the family, ${code}, to confirm.`;
  problem('validation', { errors: [{ field: 'confirm', message, value: confirm }] });
}

async function refuseIncomplete({ app, row, transaction }: Held): Promise<void> {
  const [stored] = await app.db.select<{ count: number }>(
    'SELECT COUNT(*) AS count FROM variants WHERE revision_id = :id',
    { id: row.id },
    transaction,
  );
  if (row.variantCount !== null && stored?.count === row.variantCount) return;
  problem('state-conflict', {
    detail: `${stored?.count ?? 0} of ${row.variantCount ?? 0} variants are stored. Return it and sweep it again.`,
  });
}

async function supersede({ app, row, transaction }: Held): Promise<string | null> {
  const inForce = await app.db.models.Revision.findAll({
    where: { familyId: row.familyId, state: ['published', 'locked'] },
    transaction,
    lock: transaction.LOCK.UPDATE,
  });
  for (const previous of inForce) await previous.update({ state: 'superseded' }, { transaction });
  return inForce[0]?.letter ?? null;
}
