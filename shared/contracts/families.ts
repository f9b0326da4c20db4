import { z } from 'zod';
import { idSchema, instantSchema, personRefSchema, revisionStateSchema } from './common.ts';
import { definitionSchema } from './definition.ts';

export const familyCodeSchema = z
  .string()
  .trim()
  .regex(/^[A-Z]{2,4}-\d{2,4}$/, 'Two to four capitals, a hyphen and two to four digits, e.g. GP-01.');

export const createFamilyRequest = z.strictObject({
  code: familyCodeSchema,
  title: z.string().trim().min(3).max(120),
  definition: definitionSchema,
});
export const updateFamilyRequest = z.strictObject({
  code: familyCodeSchema,
  title: z.string().trim().min(3).max(120),
});

export const revisionSummary = z.object({
  id: idSchema,
  letter: z.string().nullable(),
  state: revisionStateSchema,
  basis: z.string(),
  variants: z.number().int().nullable(),
  cells: z.number().int().nullable(),
  shortHash: z.string().nullable(),
  author: personRefSchema,
  updatedAt: instantSchema,
  publishedAt: instantSchema.nullable(),
});
export type RevisionSummary = z.infer<typeof revisionSummary>;

export const familyResponse = z.object({
  id: idSchema,
  code: z.string(),
  title: z.string(),
  kind: z.string(),
  lockVersion: z.number().int(),
  /** The one in force, if any. */
  current: revisionSummary.nullable(),
  /** The one being worked on; null to those who may not see drafts. */
  working: revisionSummary.nullable(),
  revisions: z.array(revisionSummary),
  can: z.object({ edit: z.boolean(), startRevision: z.boolean() }),
});
export type Family = z.infer<typeof familyResponse>;
export const familyListResponse = z.object({
  families: z.array(familyResponse),
  can: z.object({ create: z.boolean() }),
});

/** Answer to a faulty or hopeless definition before it is saved: counts and every fault. */
export const definitionCheckRequest = z.strictObject({ definition: definitionSchema });
export const definitionCheckResponse = z.object({
  variants: z.number(),
  angles: z.number(),
  cells: z.number(),
});
