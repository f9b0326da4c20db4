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
export async function viewRevision(
  app: App,
  person: SignedInPerson,
  id: number,
  transaction?: Transaction,
): Promise<RevisionView> {
  const row = await visibleRevision(app, person, id, transaction);
  return presentRevision(app, row, await relatedTo(app, person, row, transaction));
}

/**
 * Changes a revision in one transaction with its audit entry: holds the row, refuses an old version and what the
 * policy does not allow, then lets `change` do its part.
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
  return app.db.transaction(async (transaction) => {
    const row = await visibleRevision(app, person, id, transaction);
    const related = await relatedTo(app, person, row, transaction);
    if (row.lockVersion !== lockVersion) {
      problem('stale-version', { current: await presentRevision(app, row, related) });
    }
    if (!may(action, related.standing)) {
      const current = await presentRevision(app, row, related);
      problem('state-conflict', { detail: `${refusalOf(action)} It is ${row.state}.`, current });
    }
    const now = app.clock.now();
    const done = await change({ app, person, row, related, transaction, now });
    const event = { actorId: person.id, subjectType: 'revision', subjectId: row.id, ...done };
    const { code } = related.family;
    const detail = { family: code, letter: row.letter, ...done.detail };
    await appendAudit(transaction, { ...event, detail }, now);
    return presentRevision(app, row, await relatedTo(app, person, row, transaction));
  });
}
