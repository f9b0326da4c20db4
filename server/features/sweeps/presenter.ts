import type { z } from 'zod';
import type { PersonRef, Role } from '@shared/contracts/common.ts';
import type { sweepResponse } from '@shared/contracts/revisions.ts';
import type { JobRow } from '../../database/models/job.ts';
import type { SweepSpec } from '../../jobs/queue.ts';

/** A sweep with its true fraction, and the time left at the rate so far. */
export function presentSweep(
  job: JobRow,
  familyCode: string,
  names: ReadonlyMap<number, PersonRef>,
  role: Role,
  now: number,
): z.input<typeof sweepResponse> {
  const spec = job.spec as SweepSpec;
  const { id, state, chunkCount, chunksDone, startedAt, finishedAt } = job;
  const fraction = chunkCount === 0 ? 0 : chunksDone / chunkCount;
  const end = finishedAt?.getTime() ?? now;
  const elapsed = startedAt ? Math.max(0.001, (end - startedAt.getTime()) / 1000) : null;
  const live = state === 'running' && elapsed !== null && fraction > 0;
  return {
    id,
    revision: { id: job.revisionId, familyCode },
    state,
    variants: spec.variantCount,
    variantsDone: Math.round(spec.variantCount * fraction),
    cells: spec.cellCount,
    fraction,
    secondsLeft: live ? (elapsed / fraction) * (1 - fraction) : null,
    cellsPerSecond: elapsed !== null && fraction > 0 ? (spec.cellCount * fraction) / elapsed : null,
    error: job.error,
    requestedBy: names.get(job.requestedBy) ?? { id: job.requestedBy, name: 'unknown' },
    createdAt: job.createdAt.toISOString(),
    finishedAt: finishedAt?.toISOString() ?? null,
    can: { cancel: role === 'standards-manager' && (state === 'queued' || state === 'running') },
  };
}
