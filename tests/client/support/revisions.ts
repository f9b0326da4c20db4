import type { Definition } from '@shared/contracts/definition.ts';
import type { Revision, Sweep } from '@shared/contracts/revisions.ts';

export const definition: Definition = {
  schema: 1,
  kind: 'gusset-plate',
  basis: 'en-1993-1-8-2005',
  parameters: {
    weld_leg: { mode: 'fixed', value: 6 },
    plate_thickness: { mode: 'range', from: 10, to: 16, step: 2 },
    bolt_size: { mode: 'list', values: ['M20', 'M24'] },
    outline: { mode: 'fixed', value: 'rectangular' },
  },
  angles: { mode: 'range', from: -60, to: 60, step: 5 },
  senses: ['tension'],
  increment: 1,
  factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
};

const nothing: Revision['can'] = {
  edit: false,
  sweep: false,
  submit: false,
  sign: false,
  return: false,
  publish: false,
  lock: false,
  withdraw: false,
  export: false,
};

/** A draft of GP-07 by Thandeka, of which nobody may do anything but what is named. */
export const revisionWith = (can: Partial<Revision['can']>, more: Partial<Revision> = {}): Revision => ({
  id: 31,
  family: { id: 7, code: 'GP-07', title: 'Boat-shed roof bracing', kind: 'gusset-plate' },
  letter: null,
  state: 'draft',
  definition,
  definitionHash: 'd1'.repeat(32),
  engineVersion: null,
  contentHash: null,
  shortHash: null,
  variants: null,
  cells: null,
  rejectedCells: null,
  lockVersion: 4,
  author: { id: 1, name: 'Thandeka Marais' },
  checker: null,
  publisher: null,
  locker: null,
  updatedAt: '2026-11-28T10:00:00Z',
  submittedAt: null,
  checkedAt: null,
  publishedAt: null,
  lockedAt: null,
  signatures: [],
  sweep: null,
  withdrawnReason: null,
  can: { ...nothing, ...can },
  ...more,
});

export const sweepAt = (fraction: number, more: Partial<Sweep> = {}): Sweep => ({
  id: 9,
  revision: { id: 31, familyCode: 'GP-07' },
  state: 'running',
  variants: 200,
  variantsDone: Math.round(200 * fraction),
  cells: 5000,
  fraction,
  secondsLeft: 42,
  cellsPerSecond: 12_345.6,
  error: null,
  requestedBy: { id: 1, name: 'Thandeka Marais' },
  createdAt: '2026-11-28T10:00:00Z',
  finishedAt: null,
  can: { cancel: true },
  ...more,
});

export const json = (status: number, body: unknown) => new Response(JSON.stringify(body), { status });
