import { z } from 'zod';

export const roleSchema = z.enum(['standards-manager', 'engineer', 'drafter', 'admin']);
export type Role = z.infer<typeof roleSchema>;

/** In an address an id is digits; nothing else (`1e3`, `true`, a list) is taken for a number. */
export const idSchema = z
  .union([
    z.number(),
    z
      .string()
      .regex(/^[1-9]\d{0,15}$/)
      .transform(Number),
  ])
  .pipe(
    z
      .number()
      .int()
      .positive()
      .max(2 ** 53 - 1),
  );
export const idParams = z.strictObject({ id: idSchema });

export const revisionStateSchema = z.enum([
  'draft',
  'swept',
  'in-check',
  'checked',
  'published',
  'locked',
  'superseded',
  'withdrawn',
]);
export type RevisionState = z.infer<typeof revisionStateSchema>;

/** A person as others see them. */
export const personRefSchema = z.object({ id: idSchema, name: z.string() });
export type PersonRef = z.infer<typeof personRefSchema>;

/** RFC 3339 instant in UTC. */
export const instantSchema = z.string();

export const faultSchema = z.object({
  /** Path of the field, e.g. `definition.parameters.pitch.to`. */
  field: z.string(),
  message: z.string(),
  value: z.unknown().optional(),
  /** In an expression: places of the first character at fault and after the last. */
  place: z.object({ start: z.number().int(), end: z.number().int() }).optional(),
});
export type Fault = z.infer<typeof faultSchema>;

/** RFC 9457 problem details, with every fault listed. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  code: z.string(),
  detail: z.string().optional(),
  instance: z.string().optional(),
  requestId: z.string().optional(),
  errors: z.array(faultSchema).optional(),
  /** For conflicts: the version that won. */
  current: z.unknown().optional(),
});
export type Problem = z.infer<typeof problemSchema>;
