import { z } from 'zod';
import { idSchema, instantSchema } from './common.ts';
import { parameterValueSchema, senseSchema } from './definition.ts';
import { rejectionSchema } from './revisions.ts';

/** The published details that can be looked up: one entry a family, at its current revision. */
export const lookupDetailsResponse = z.object({
  details: z.array(
    z.object({
      familyId: idSchema,
      code: z.string(),
      title: z.string(),
      revisionId: idSchema,
      letter: z.string(),
      state: z.string(),
      shortHash: z.string(),
      basis: z.string(),
      senses: z.array(senseSchema),
      angleMinimum: z.number(),
      angleMaximum: z.number(),
      choices: z.array(
        z.object({
          name: z.string(),
          label: z.string(),
          symbol: z.string(),
          unit: z.string(),
          values: z.array(parameterValueSchema),
        }),
      ),
      fixed: z.array(
        z.object({ name: z.string(), label: z.string(), unit: z.string(), value: parameterValueSchema }),
      ),
      /** Parameters that follow from others, and the expression that says how. */
      derived: z.array(
        z.object({ name: z.string(), label: z.string(), unit: z.string(), expression: z.string() }),
      ),
    }),
  ),
});
export type LookupDetails = z.infer<typeof lookupDetailsResponse>;

export const lookupRequest = z.strictObject({
  revisionId: idSchema,
  /** One value for each swept parameter of the revision. */
  choices: z.record(z.string().max(40), parameterValueSchema),
  angle: z.number().min(-180).max(180),
  sense: senseSchema,
  /** Factored (or, for an allowable-strength basis, service) load in kN. */
  load: z.number().positive().max(1e6).optional(),
});
export const lookupResponse = z.object({
  family: z.object({ id: idSchema, code: z.string(), title: z.string() }),
  revision: z.object({
    id: idSchema,
    letter: z.string(),
    state: z.string(),
    contentHash: z.string(),
    shortHash: z.string(),
    publishedAt: instantSchema,
    engineVersion: z.string(),
  }),
  basis: z.object({ id: z.string(), title: z.string(), resultLabel: z.string() }),
  ordinal: z.number().int(),
  angle: z.number(),
  sense: senseSchema,
  outcome: z.discriminatedUnion('status', [
    z.object({
      status: z.literal('capacity'),
      /** kN, rounded down to the revision's increment: the value to use. */
      capacity: z.number(),
      /** kN before rounding, for verification. */
      unrounded: z.number(),
      governing: z.object({
        id: z.string(),
        code: z.string(),
        title: z.string(),
        part: z.string(),
        clause: z.string(),
      }),
      utilisation: z.number().nullable(),
      adequate: z.boolean().nullable(),
    }),
    z.object({ status: z.literal('not-permitted'), rejections: z.array(rejectionSchema) }),
    z.object({ status: z.literal('not-covered'), reason: z.string() }),
  ]),
  curve: z.object({
    angles: z.array(z.number()),
    capacity: z.array(z.number().nullable()),
    governing: z.array(z.number().int()),
  }),
  legend: z.array(z.object({ id: z.string(), code: z.string(), title: z.string(), part: z.string() })),
  notes: z.array(z.string()),
  cautions: z.array(z.string()),
});
export type LookupAnswer = z.infer<typeof lookupResponse>;
