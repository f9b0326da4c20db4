import { z } from 'zod';
import { idSchema, instantSchema, personRefSchema, revisionStateSchema } from './common.ts';
import { definitionSchema, senseSchema } from './definition.ts';

export const revisionResponse = z.object({
  id: idSchema,
  family: z.object({ id: idSchema, code: z.string(), title: z.string(), kind: z.string() }),
  letter: z.string().nullable(),
  state: revisionStateSchema,
  definition: definitionSchema,
  definitionHash: z.string(),
  engineVersion: z.string().nullable(),
  contentHash: z.string().nullable(),
  shortHash: z.string().nullable(),
  variants: z.number().int().nullable(),
  cells: z.number().int().nullable(),
  rejectedCells: z.number().int().nullable(),
  lockVersion: z.number().int(),
  author: personRefSchema,
  checker: personRefSchema.nullable(),
  publisher: personRefSchema.nullable(),
  locker: personRefSchema.nullable(),
  updatedAt: instantSchema,
  submittedAt: instantSchema.nullable(),
  checkedAt: instantSchema.nullable(),
  publishedAt: instantSchema.nullable(),
  lockedAt: instantSchema.nullable(),
  signatures: z.array(
    z.object({
      person: personRefSchema,
      verdict: z.enum(['submitted', 'signed', 'returned']),
      comment: z.string(),
      at: instantSchema,
    }),
  ),
  sweep: z.object({ id: idSchema, state: z.string() }).nullable(),
  withdrawnReason: z.string().nullable(),
  can: z.object({
    edit: z.boolean(),
    sweep: z.boolean(),
    submit: z.boolean(),
    sign: z.boolean(),
    return: z.boolean(),
    publish: z.boolean(),
    lock: z.boolean(),
    withdraw: z.boolean(),
    export: z.boolean(),
  }),
});
export type Revision = z.infer<typeof revisionResponse>;

/** Saved versions of a definition, newest first; the oldest of many are left out. */
export const savedVersionsResponse = z.object({
  total: z.number().int(),
  saves: z.array(
    z.object({
      number: z.number().int(),
      at: instantSchema,
      person: personRefSchema,
      definition: definitionSchema,
    }),
  ),
});
export type SavedVersion = z.infer<typeof savedVersionsResponse>['saves'][number];

export const saveDefinitionRequest = z.strictObject({ definition: definitionSchema });
export const commentRequest = z.strictObject({ comment: z.string().trim().min(3).max(2000) });
export const submitRequest = z.strictObject({ comment: z.string().trim().max(2000).default('') });
export const reasonRequest = z.strictObject({ reason: z.string().trim().min(3).max(2000) });
export const confirmRequest = z.strictObject({
  /** The family code, typed by hand. */
  confirm: z.string().trim().max(20),
});

/** Sweep of a revision. */
export const sweepStateSchema = z.enum(['queued', 'running', 'done', 'failed', 'cancelled']);
export const sweepResponse = z.object({
  id: idSchema,
  revision: z.object({ id: idSchema, familyCode: z.string() }),
  state: sweepStateSchema,
  variants: z.number().int(),
  variantsDone: z.number().int(),
  cells: z.number().int(),
  fraction: z.number().min(0).max(1),
  secondsLeft: z.number().nullable(),
  cellsPerSecond: z.number().nullable(),
  error: z.string().nullable(),
  requestedBy: personRefSchema,
  createdAt: instantSchema,
  finishedAt: instantSchema.nullable(),
  can: z.object({ cancel: z.boolean() }),
});
export type Sweep = z.infer<typeof sweepResponse>;
export const sweepListResponse = z.object({ sweeps: z.array(sweepResponse) });

/** What a swept revision's cells are laid out over, and the legend they use. */
export const resultAxesResponse = z.object({
  revisionId: idSchema,
  /** Swept parameters, in ordinal order: the last varies fastest. */
  axes: z.array(
    z.object({
      name: z.string(),
      label: z.string(),
      symbol: z.string(),
      unit: z.string(),
      values: z.array(z.unknown()),
    }),
  ),
  angles: z.array(z.number()),
  senses: z.array(senseSchema),
  increment: z.number(),
  variants: z.number().int(),
  limitStates: z.array(
    z.object({ id: z.string(), code: z.string(), title: z.string(), part: z.string(), clause: z.string() }),
  ),
  rules: z.array(
    z.object({ rule: z.string(), title: z.string(), clause: z.string(), cells: z.number().int() }),
  ),
  lowest: z.number().nullable(),
  highest: z.number().nullable(),
  rejectedCells: z.number().int(),
});
export type ResultAxes = z.infer<typeof resultAxesResponse>;

/**
 * A block of whole variants, in ordinal order, as flat columns: for variant i, sense s and angle a the cell
 * stands at (i * senses + s) * angles + a. Capacity in kN rounded down to the increment, null where there is none;
 * governing is an index into limitStates, or -1 - k where rule k of `rules` rejects the cell.
 */
export const resultBlockQuery = z.strictObject({
  from: z.coerce.number().int().min(0).default(0),
  count: z.coerce.number().int().min(1).max(20000).default(5000),
});
export const resultBlockResponse = z.object({
  from: z.number().int(),
  count: z.number().int(),
  capacity: z.array(z.number().nullable()),
  governing: z.array(z.number().int()),
  mass: z.array(z.number()),
  boltCount: z.array(z.number().int()),
  weldVolume: z.array(z.number()),
});
export type ResultBlock = z.infer<typeof resultBlockResponse>;

export const variantParams = z.strictObject({ id: idSchema, ordinal: z.coerce.number().int().min(0) });

/** Curve of one variant: the envelope and every limit state, kN, at the given angles. */
export const curveQuery = z.strictObject({
  sense: senseSchema,
  step: z.coerce.number().min(0.5).max(15).default(1),
});
export const curveResponse = z.object({
  angles: z.array(z.number()),
  capacity: z.array(z.number().nullable()),
  governing: z.array(z.number().int()),
  limitStates: z.array(
    z.object({
      id: z.string(),
      code: z.string(),
      title: z.string(),
      part: z.string(),
      capacity: z.array(z.number().nullable()),
    }),
  ),
});
export type Curve = z.infer<typeof curveResponse>;

export const sheetQuery = z.strictObject({ sense: senseSchema, angle: z.coerce.number().min(-180).max(180) });
export const rejectionSchema = z.object({
  rule: z.string(),
  title: z.string(),
  clause: z.string(),
  message: z.string(),
  value: z.number(),
  limit: z.number(),
  unit: z.string(),
});
export const sheetResponse = z.object({
  family: z.object({ code: z.string(), title: z.string() }),
  revision: z.object({
    id: idSchema,
    letter: z.string().nullable(),
    state: revisionStateSchema,
    shortHash: z.string().nullable(),
  }),
  basis: z.object({ id: z.string(), title: z.string(), resultLabel: z.string() }),
  engineVersion: z.string(),
  angle: z.number(),
  sense: senseSchema,
  parameters: z.array(
    z.object({
      name: z.string(),
      label: z.string(),
      symbol: z.string(),
      unit: z.string(),
      group: z.string(),
      value: z.unknown(),
      /** A derived parameter: what its value follows from; null for others. */
      expression: z.string().nullable(),
    }),
  ),
  outcome: z.discriminatedUnion('status', [
    z.object({
      status: z.literal('capacity'),
      capacity: z.number(),
      rounded: z.number(),
      governing: z.string(),
    }),
    z.object({ status: z.literal('not-permitted'), rejections: z.array(rejectionSchema) }),
    z.object({ status: z.literal('not-covered'), reason: z.string() }),
  ]),
  sections: z.array(
    z.object({
      id: z.string(),
      title: z.string(),
      code: z.string().nullable(),
      /** kN; null where the limit state does not apply. */
      capacity: z.number().nullable(),
      lines: z.array(
        z.object({
          symbol: z.string(),
          meaning: z.string(),
          formula: z.string(),
          value: z.union([z.number(), z.string()]),
          unit: z.string(),
          clause: z.string(),
        }),
      ),
    }),
  ),
  notes: z.array(z.string()),
  cautions: z.array(z.string()),
});
export type Sheet = z.infer<typeof sheetResponse>;
