import type { Transaction } from 'sequelize';
import type { Definition } from '@shared/contracts/definition.ts';
import type { App } from '../../context.ts';
import type { FamilyRow } from '../../database/models/family.ts';
import type { JobRow } from '../../database/models/job.ts';
import type { RevisionRow } from '../../database/models/revision.ts';
import type { SignatureRow } from '../../database/models/signature.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { maySee, type Standing } from './policy.ts';

/** The definition that a revision was saved with. */
export const definitionOf = (row: Pick<RevisionRow, 'definition'>): Definition =>
  JSON.parse(row.definition) as Definition;

/** The revision, or null when there is none that this person may see. */
export async function findVisible(
  app: App,
  person: Pick<SignedInPerson, 'role'>,
  id: number,
  transaction?: Transaction,
): Promise<RevisionRow | null> {
  const lock = transaction ? { transaction, lock: transaction.LOCK.UPDATE } : {};
  const row = await app.db.models.Revision.findByPk(id, lock);
  return row && maySee(person.role, row.state) ? row : null;
}

/**
 * The revision, read for this person; within a transaction its row is held.
 * @throws {ProblemError} not-found, also for what the person may not see
 */
export async function visibleRevision(
  app: App,
  person: Pick<SignedInPerson, 'role'>,
  id: number,
  transaction?: Transaction,
): Promise<RevisionRow> {
  return (await findVisible(app, person, id, transaction)) ?? problem('not-found');
}

/** What stands around a revision. */
export interface Related {
  readonly family: FamilyRow;
  readonly signatures: readonly SignatureRow[];
  readonly job: JobRow | null;
  readonly standing: Standing;
}

/** Family, signatures, latest sweep, and how the person stands to the revision. */
export async function relatedTo(
  app: App,
  person: Pick<SignedInPerson, 'id' | 'role'>,
  row: RevisionRow,
  transaction?: Transaction,
): Promise<Related> {
  const { Family, Signature, Job, DefinitionSave } = app.db.models;
  const options = transaction ? { transaction } : {};
  const where = { revisionId: row.id };
  const family = await Family.findByPk(row.familyId, options);
  if (!family) throw new Error(`Revision ${row.id} has no family`);
  const signatures = await Signature.findAll({ where, order: [['id', 'ASC']], ...options });
  const job = await Job.findOne({ where, order: [['id', 'DESC']], ...options });
  const saves = await DefinitionSave.count({ where: { ...where, personId: person.id }, ...options });
  const standing: Standing = {
    role: person.role,
    state: row.state,
    wrote: row.authorId === person.id || saves > 0,
    sweeping: job?.state === 'queued' || job?.state === 'running',
  };
  return { family, signatures, job, standing };
}
