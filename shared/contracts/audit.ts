import { z } from 'zod';
import { idSchema, instantSchema, personRefSchema } from './common.ts';

export const auditQuery = z.strictObject({
  before: z.coerce.number().int().positive().optional(),
  count: z.coerce.number().int().min(1).max(200).default(50),
});
export const auditEntry = z.object({
  seq: idSchema,
  at: instantSchema,
  actor: personRefSchema.nullable(),
  action: z.string(),
  subjectType: z.string(),
  subjectId: z.string(),
  detail: z.record(z.string(), z.unknown()),
  hash: z.string(),
});
export type AuditEntry = z.infer<typeof auditEntry>;
export const auditListResponse = z.object({
  entries: z.array(auditEntry),
  next: z.number().int().nullable(),
});
export const auditVerificationResponse = z.object({
  valid: z.boolean(),
  entries: z.number().int(),
  headHash: z.string(),
  faults: z.array(z.object({ seq: z.number().int(), message: z.string() })),
});

/** Which standard the weld symbols on drawings follow. */
export const weldSymbols = z.enum(['iso-2553', 'aws-a2.4']);

export const settingsResponse = z.object({
  firm: z.string(),
  increment: z.number(),
  factors: z.object({ gammaM0: z.number(), gammaM1: z.number(), gammaM2: z.number() }),
  weldSymbols,
  lockVersion: z.number().int(),
});
export const updateSettingsRequest = z.strictObject({
  firm: z.string().trim().min(1).max(120),
  increment: z.number().positive().max(100),
  factors: z.strictObject({
    gammaM0: z.number().min(0.9).max(2),
    gammaM1: z.number().min(0.9).max(2),
    gammaM2: z.number().min(1).max(2),
  }),
  weldSymbols,
});
