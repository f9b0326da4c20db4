import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { revisionResponse } from '@shared/contracts/revisions.ts';
import type { App } from '../../context.ts';
import type { RevisionRow } from '../../database/models/revision.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { appendAudit } from '../audit/service.ts';
import { may, refusalOf, type RevisionAction } from './policy.ts';
import { presentRevision } from './presenter.ts';
import { relatedTo, visibleRevision, type Related } from './read-service.ts';

export type RevisionView = z.input<typeof revisionResponse>;

/** A revision that is being changed: its row is held until the transaction ends. */
export interface Held {
  readonly app: App;
  readonly person: SignedInPerson;
  readonly row: RevisionRow;
  readonly related: Related;
  readonly transaction: Transaction;
  readonly now: Date;
}

/** What a change leaves in the audit trail. */
export interface Done {
  readonly action: string;
  readonly detail?: Record<string, unknown>;
}

/** The revision as this person sees it now. */
export async function viewRevision(app: App, person: SignedInPerson, id: number): Promise<RevisionView> {
  return present(app, person, await visibleRevision(app, person, id));
}

async function present(app: App, person: SignedInPerson, row: RevisionRow): Promise<RevisionView> {
  return presentRevision(app, row, await relatedTo(app, person, row));
}

/** Found inside the transaction; told outside it, with the record as it then stands. */
class Refused extends Error {
  constructor(
    readonly code: 'stale-version' | 'state-conflict',
    detail?: string,
  ) {
    super(detail ?? code);
  }
}

/**
 * Changes a revision in one transaction with its audit entry: holds the row, refuses an old version and what the
 * policy does not allow, then lets `change` do its part. What is shown is read after the transaction, which must not
 * wait for a second connection.
 * @throws {ProblemError} not-found, stale-version with the newer record, state-conflict
 */
export async function changeRevision(
  app: App,
  person: SignedInPerson,
  id: number,
  lockVersion: number,
  action: RevisionAction,
  change: (held: Held) => Promise<Done>,
): Promise<RevisionView> {
  try {
    await app.db.transaction(async (transaction) => {
      const row = await visibleRevision(app, person, id, transaction);
      const related = await relatedTo(app, person, row, transaction);
      if (row.lockVersion !== lockVersion) throw new Refused('stale-version');
      if (!may(action, related.standing)) {
        throw new Refused('state-conflict', `${refusalOf(action)} It is ${row.state}.`);
      }
      await changeHeld({ app, person, row, related, transaction, now: app.clock.now() }, change);
    });
  } catch (error) {
    if (!(error instanceof Refused)) throw error;
    const current = await viewRevision(app, person, id);
    problem(error.code, error.code === 'stale-version' ? { current } : { detail: error.message, current });
  }
  // Whoever returned a revision is shown that it was done, though a draft is no longer theirs to see.
  const row = await app.db.models.Revision.findByPk(id);
  return row ? present(app, person, row) : problem('not-found');
}

async function changeHeld(held: Held, change: (held: Held) => Promise<Done>): Promise<void> {
  const { person, row, related, transaction, now } = held;
  const done = await change(held);
  const event = { actorId: person.id, subjectType: 'revision', subjectId: row.id, ...done };
  const detail = { family: related.family.code, letter: row.letter, ...done.detail };
  await appendAudit(transaction, { ...event, detail }, now);
}
