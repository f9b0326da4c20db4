import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { createFamilyRequest, updateFamilyRequest } from '@shared/contracts/families.ts';
import type { App } from '../../context.ts';
import type { FamilyRow } from '../../database/models/family.ts';
import type { RevisionRow } from '../../database/models/revision.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { appendAudit } from '../audit/service.ts';
import { isCurrent, isIssued, keepSave } from '../revisions/service.ts';
import { checkDefinition } from './definition-service.ts';
import { presentFamilies, type FamilyView } from './presenter.ts';

/** Families with at least one revision that this person may see, by code. */
export async function listFamilies(app: App, person: SignedInPerson): Promise<FamilyView[]> {
  const { Family, Revision } = app.db.models;
  const families = await Family.findAll({ order: [['code', 'ASC']] });
  const revisions = await Revision.findAll({
    order: [['sequence', 'DESC']],
    attributes: { exclude: ['resultSummary'] },
  });
  return presentFamilies(app, person, families, revisions);
}

/** @throws {ProblemError} not-found */
export async function viewFamily(app: App, person: SignedInPerson, id: number): Promise<FamilyView> {
  const family = await app.db.models.Family.findByPk(id);
  if (!family) return problem('not-found');
  const where = { familyId: id };
  const revisions = await app.db.models.Revision.findAll({ where, order: [['sequence', 'DESC']] });
  const [view] = await presentFamilies(app, person, [family], revisions);
  return view ?? problem('not-found');
}

/**
 * Makes a family with its first draft.
 * @throws {ProblemError} validation, conflict when the code is taken
 */
export async function createFamily(
  app: App,
  person: SignedInPerson,
  { code, title, definition }: z.output<typeof createFamilyRequest>,
): Promise<FamilyView> {
  const checked = checkDefinition(definition);
  const id = await app.db.transaction(async (transaction) => {
    await refuseTakenCode(app, code, null, transaction);
    const family = await app.db.models.Family.create({ code, title, kind: checked.kind.id }, { transaction });
    const draft = { definition: checked.text, definitionHash: checked.hash };
    await addDraft(app, person, family, 1, draft, transaction);
    await record(app, person, family, 'family.created', { code, title }, transaction);
    return family.id;
  });
  return viewFamily(app, person, id);
}

/** @throws {ProblemError} not-found, stale-version, conflict */
export async function updateFamily(
  app: App,
  person: SignedInPerson,
  id: number,
  lockVersion: number,
  change: z.output<typeof updateFamilyRequest>,
): Promise<FamilyView> {
  const stale = await app.db.transaction(async (transaction) => {
    const family = await heldFamily(app, id, transaction);
    if (family.lockVersion !== lockVersion) return true;
    await refuseTakenCode(app, change.code, id, transaction);
    await refuseRenameOfIssued(app, family, change.code, transaction);
    const before = { code: family.code, title: family.title };
    await family.update(change, { transaction });
    await record(app, person, family, 'family.changed', { before, after: change }, transaction);
    return false;
  });
  const current = await viewFamily(app, person, id);
  return stale ? problem('stale-version', { current }) : current;
}

/**
 * Starts the next draft from the revision in force, or from the latest one.
 * @throws {ProblemError} not-found, state-conflict when a draft is under way
 */
export async function startRevision(app: App, person: SignedInPerson, id: number): Promise<FamilyView> {
  await app.db.transaction(async (transaction) => {
    const family = await heldFamily(app, id, transaction);
    const revisions = await revisionsOf(app, family, transaction);
    const open = revisions.find(({ state }) => !isIssued(state));
    if (open) problem('state-conflict', { detail: `A revision of ${family.code} is under way already.` });
    const origin = revisions.find(({ state }) => isCurrent(state)) ?? revisions[0];
    if (!origin) throw new Error(`Family ${id} has no revision`);
    await addDraft(app, person, family, (revisions[0]?.sequence ?? 0) + 1, origin, transaction);
    await record(app, person, family, 'revision.started', { from: origin.letter }, transaction);
  });
  return viewFamily(app, person, id);
}

const revisionsOf = (app: App, family: FamilyRow, transaction: Transaction): Promise<RevisionRow[]> =>
  app.db.models.Revision.findAll({
    where: { familyId: family.id },
    order: [['sequence', 'DESC']],
    transaction,
  });

async function heldFamily(app: App, id: number, transaction: Transaction): Promise<FamilyRow> {
  const family = await app.db.models.Family.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE });
  return family ?? problem('not-found');
}

async function addDraft(
  app: App,
  person: SignedInPerson,
  family: FamilyRow,
  sequence: number,
  { definition, definitionHash }: Pick<RevisionRow, 'definition' | 'definitionHash'>,
  transaction: Transaction,
): Promise<void> {
  const draft = { familyId: family.id, sequence, definition, definitionHash, authorId: person.id };
  const row = await app.db.models.Revision.create(draft, { transaction });
  await keepSave({ app, row, person, transaction });
}

async function refuseTakenCode(app: App, code: string, own: number | null, transaction: Transaction) {
  const other = await app.db.models.Family.findOne({ where: { code }, transaction });
  if (!other || other.id === own) return;
  const message = `${code} is the code of another family, ${other.title}.`;
  problem('conflict', { detail: message, errors: [{ field: 'code', message, value: code }] });
}

/** A code that stands on drawings stays. */
async function refuseRenameOfIssued(app: App, family: FamilyRow, code: string, transaction: Transaction) {
  if (code === family.code) return;
  const issued = (await revisionsOf(app, family, transaction)).some(({ state }) => isIssued(state));
  if (!issued) return;
  const message = `${family.code} was published under this code, which stays.`;
  problem('state-conflict', { detail: message, errors: [{ field: 'code', message, value: code }] });
}

function record(
  app: App,
  person: SignedInPerson,
  family: FamilyRow,
  action: string,
  detail: Record<string, unknown>,
  transaction: Transaction,
): Promise<void> {
  const subject = { subjectType: 'family', subjectId: family.id };
  return appendAudit(transaction, { actorId: person.id, action, ...subject, detail }, app.clock.now());
}
