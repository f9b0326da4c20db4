import type { z } from 'zod';
import type { sweepResponse } from '@shared/contracts/revisions.ts';
import type { App } from '../../context.ts';
import type { JobRow } from '../../database/models/job.ts';
import { problem } from '../../http/problems.ts';
import type { SignedInPerson } from '../../http/route.ts';
import { enqueueSweep } from '../../jobs/queue.ts';
import { appendAudit } from '../audit/service.ts';
import { layOut } from '../families/definition-service.ts';
import { changeRevision, peopleOf } from '../revisions/service.ts';
import { presentSweep } from './presenter.ts';

export type SweepView = z.input<typeof sweepResponse>;

/** Sweeps shown in the list: the live ones and the latest. */
const LATEST = 50;

/**
 * Puts a sweep of the draft as it is saved into the queue.
 * @throws {ProblemError} not-found, stale-version, state-conflict
 */
export async function startSweep(
  app: App,
  person: SignedInPerson,
  revisionId: number,
  version: number,
): Promise<SweepView> {
  let jobId = 0;
  await changeRevision(app, person, revisionId, version, 'sweep', async ({ row, transaction }) => {
    const { grid, hash } = layOut(row.definition);
    const { variantCount, cellCount } = grid;
    const spec = { definitionHash: hash, variantCount, cellCount };
    await app.db.execute('DELETE FROM variants WHERE revision_id = :id', { id: row.id }, transaction);
    jobId = await enqueueSweep(app.db, { revisionId, requestedBy: person.id, spec }, transaction);
    return { action: 'revision.sweep-asked', detail: { variants: variantCount, cells: cellCount } };
  });
  app.hub.publish('sweep-queued', jobId);
  return viewSweep(app, person, jobId);
}

/** @throws {ProblemError} not-found */
export async function viewSweep(app: App, person: SignedInPerson, id: number): Promise<SweepView> {
  const job = await app.db.models.Job.findByPk(id);
  const [view] = job ? await present(app, person, [job]) : [];
  return view ?? problem('not-found');
}

/** The latest sweeps, newest first. */
export async function listSweeps(app: App, person: SignedInPerson): Promise<SweepView[]> {
  return present(app, person, await app.db.models.Job.findAll({ order: [['id', 'DESC']], limit: LATEST }));
}

/**
 * Asks a sweep to stop; one that waits is cancelled at once.
 * @throws {ProblemError} not-found, state-conflict when it has ended
 */
export async function cancelSweep(app: App, person: SignedInPerson, id: number): Promise<SweepView> {
  await app.db.transaction(async (transaction) => {
    const job = await app.db.models.Job.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE });
    if (!job) return problem('not-found');
    if (job.state === 'queued')
      await job.update({ state: 'cancelled', finishedAt: app.clock.now() }, { transaction });
    else if (job.state === 'running') await job.update({ cancelRequested: true }, { transaction });
    else problem('state-conflict', { detail: `This sweep has ended already; it is ${job.state}.` });
    const subject = { subjectType: 'revision', subjectId: job.revisionId };
    const event = {
      actorId: person.id,
      action: 'revision.sweep-cancelled',
      ...subject,
      detail: { sweep: id },
    };
    await appendAudit(transaction, event, app.clock.now());
  });
  return viewSweep(app, person, id);
}

async function present(app: App, person: SignedInPerson, jobs: readonly JobRow[]): Promise<SweepView[]> {
  const { Revision, Family } = app.db.models;
  const ids = [...new Set(jobs.map(({ revisionId }) => revisionId))];
  const revisions = await Revision.findAll({ where: { id: ids }, attributes: ['id', 'familyId'] });
  const families = await Family.findAll({ where: { id: revisions.map(({ familyId }) => familyId) } });
  const names = await peopleOf(
    app,
    jobs.map(({ requestedBy }) => requestedBy),
  );
  const codeOf = (revisionId: number) => {
    const familyId = revisions.find(({ id }) => id === revisionId)?.familyId;
    return families.find(({ id }) => id === familyId)?.code ?? '';
  };
  const now = await databaseNow(app);
  return jobs.map((job) => presentSweep(job, codeOf(job.revisionId), names, person.role, now));
}

/** The database's clock: the one that stamped the start. */
async function databaseNow(app: App): Promise<number> {
  const [row] = await app.db.select<{ now: Date | string }>('SELECT NOW(3) AS now');
  return new Date(row?.now ?? app.clock.now()).getTime();
}
