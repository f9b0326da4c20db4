import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { createPersonRequest, updatePersonRequest } from '@shared/contracts/auth.ts';
import type { App } from '../../context.ts';
import type { PersonRow } from '../../database/models/person.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { endSessions, hashPassword } from '../auth/service.ts';
import { appendAudit } from '../audit/service.ts';
import { refusalOf } from './policy.ts';
import { presentPerson } from './presenter.ts';

export { addDemoPeople, demoPeople, demoPeopleHere } from './demo-service.ts';

export const listPeople = (app: App): Promise<PersonRow[]> =>
  app.db.models.Person.findAll({
    order: [
      ['name', 'ASC'],
      ['id', 'ASC'],
    ],
  });

/** Adds a person who can sign in at once. */
export async function createPerson(
  app: App,
  actor: SignedInPerson,
  { password, ...fields }: z.output<typeof createPersonRequest>,
): Promise<PersonRow> {
  const passwordHash = await hashPassword(password);
  return app.db.transaction(async (transaction) => {
    const { Person } = app.db.models;
    if (await Person.findOne({ where: { email: fields.email }, transaction })) {
      problem('conflict', {
        detail: 'Somebody has this e-mail address already.',
        errors: [
          { field: 'email', message: 'Somebody has this e-mail address already.', value: fields.email },
        ],
      });
    }
    const person = await Person.create({ ...fields, passwordHash }, { transaction });
    await record(app, transaction, actor, 'person.created', person, { name: person.name, role: person.role });
    return person;
  });
}

function record(
  app: App,
  transaction: Transaction,
  actor: SignedInPerson,
  action: string,
  person: PersonRow,
  detail: Record<string, unknown>,
): Promise<void> {
  const event = { actorId: actor.id, action, subjectType: 'person', subjectId: person.id, detail };
  return appendAudit(transaction, event, app.clock.now());
}

/** Locks every active admin, so that two who leave at the same moment see each other. */
async function otherAdmins(app: App, id: number, transaction: Transaction): Promise<number> {
  const admins = await app.db.select<{ id: number }>(
    "SELECT id FROM people WHERE role = 'admin' AND state = 'active' ORDER BY id FOR UPDATE",
    undefined,
    transaction,
  );
  return admins.filter((admin) => admin.id !== id).length;
}

/**
 * Changes name, role or state. A new role counts from the person's next request; a disabled person's sessions end.
 * @throws {ProblemError} not-found, stale-version, state-conflict for the last admin or oneself
 */
export async function updatePerson(
  app: App,
  actor: SignedInPerson,
  id: number,
  lockVersion: number,
  change: z.output<typeof updatePersonRequest>,
): Promise<PersonRow> {
  return app.db.transaction(async (transaction) => {
    const others = await otherAdmins(app, id, transaction);
    const person = await app.db.models.Person.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE });
    if (!person) return problem('not-found');
    if (person.lockVersion !== lockVersion) problem('stale-version', { current: presentPerson(person) });
    const before = { name: person.name, role: person.role, state: person.state };
    const after = { ...before, ...change };
    const refusal = refusalOf({ self: actor.id === id, lastAdmin: others === 0, before, after });
    if (refusal) problem('state-conflict', { detail: refusal });
    await person.update(after, { transaction });
    if (after.state === 'disabled') await endSessions(app, id, transaction);
    await record(app, transaction, actor, 'person.changed', person, { before, after });
    return person;
  });
}
