import { z } from 'zod';
import { idSchema, instantSchema, roleSchema } from './common.ts';

export const emailSchema = z.string().trim().toLowerCase().max(254).email();
export const newPasswordSchema = z
  .string()
  .min(15, 'A password needs at least 15 characters; a sentence works well.')
  .max(200, 'A password may have at most 200 characters.');

export const signInRequest = z.strictObject({ email: emailSchema, password: z.string().min(1).max(1000) });
export const changePasswordRequest = z.strictObject({
  current: z.string().min(1).max(1000),
  next: newPasswordSchema,
});

/** What the signed-in person may do beyond single records. */
export const personAbilities = z.object({
  defineFamilies: z.boolean(),
  seeDrafts: z.boolean(),
  exportTables: z.boolean(),
  managePeople: z.boolean(),
  readAudit: z.boolean(),
});
export const meResponse = z.object({
  id: idSchema,
  name: z.string(),
  email: z.string(),
  role: roleSchema,
  can: personAbilities,
});
export type Me = z.infer<typeof meResponse>;

/** Only in demo mode: the invented people and their password, shown on the sign-in page. */
export const demoPeopleResponse = z.object({
  people: z.array(z.object({ name: z.string(), email: z.string(), role: roleSchema, password: z.string() })),
});

export const personResponse = z.object({
  id: idSchema,
  name: z.string(),
  email: z.string(),
  role: roleSchema,
  state: z.enum(['active', 'disabled']),
  lockVersion: z.number().int(),
  lastSignInAt: instantSchema.nullable(),
});
export type Person = z.infer<typeof personResponse>;
export const createPersonRequest = z.strictObject({
  name: z.string().trim().min(1).max(120),
  email: emailSchema,
  role: roleSchema,
  password: newPasswordSchema,
});
export const updatePersonRequest = z.strictObject({
  name: z.string().trim().min(1).max(120).optional(),
  role: roleSchema.optional(),
  state: z.enum(['active', 'disabled']).optional(),
});
