import { z } from 'zod';
import { EXPRESSION_LIMITS } from '../expressions/types.ts';

/**
 * A family's definition: the kind, the basis, and how each parameter varies.
 * It is frozen with a revision, and its hash (canonical JSON, SHA-256) names it.
 */
export const parameterValueSchema = z.union([
  z.number(),
  z.string().max(80),
  z.boolean(),
  z.record(z.string().max(40), z.union([z.number(), z.string().max(80)])),
]);

export const LIMITS = {
  values: 500,
  variants: 1_000_000,
  cells: 20_000_000,
  angles: 721,
  increments: [0.1, 0.5, 1, 2, 5, 10],
  /** Characters of an expression. */
  expression: EXPRESSION_LIMITS.length,
  rules: 20,
} as const;

const expressionSchema = z.string().min(1).max(LIMITS.expression);

export const parameterSettingSchema = z.discriminatedUnion('mode', [
  z.strictObject({ mode: z.literal('fixed'), value: parameterValueSchema }),
  z.strictObject({
    mode: z.literal('list'),
    values: z.array(parameterValueSchema).min(1).max(LIMITS.values),
  }),
  z.strictObject({
    mode: z.literal('range'),
    from: z.number(),
    to: z.number(),
    step: z.number().positive(),
  }),
  z.strictObject({ mode: z.literal('derived'), expression: expressionSchema }),
]);
export type ParameterSetting = z.infer<typeof parameterSettingSchema>;

/** A rule of the family: a variant for which the expression does not hold is rejected with the message. */
export const familyRuleSchema = z.strictObject({
  expression: expressionSchema,
  message: z.string().trim().min(3).max(160),
});
export type FamilyRule = z.infer<typeof familyRuleSchema>;

/** Load angles in degrees. */
export const angleGridSchema = z.discriminatedUnion('mode', [
  z.strictObject({
    mode: z.literal('range'),
    from: z.number().min(-180).max(180),
    to: z.number().min(-180).max(180),
    step: z.number().min(0.25).max(180),
  }),
  z.strictObject({
    mode: z.literal('list'),
    values: z.array(z.number().min(-180).max(180)).min(1).max(LIMITS.angles),
  }),
]);
export type AngleGrid = z.infer<typeof angleGridSchema>;

export const senseSchema = z.enum(['tension', 'compression']);

export const definitionSchema = z.strictObject({
  schema: z.literal(1),
  kind: z.string().min(1).max(40),
  basis: z.string().min(1).max(40),
  parameters: z.record(z.string().max(40), parameterSettingSchema),
  /** Left out where there is none, so that definitions without rules keep their canonical form. */
  rules: z.array(familyRuleSchema).max(LIMITS.rules).optional(),
  angles: angleGridSchema,
  senses: z.array(senseSchema).min(1).max(2),
  /** Published values are rounded down to this, kN. Cells are stored in single precision, which tells 0.1 kN apart. */
  increment: z.number().min(0.1).max(100),
  factors: z.strictObject({
    gammaM0: z.number().min(0.9).max(2),
    gammaM1: z.number().min(0.9).max(2),
    gammaM2: z.number().min(1).max(2),
  }),
});
export type Definition = z.infer<typeof definitionSchema>;
