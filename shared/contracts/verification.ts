import { z } from 'zod';

export const evidenceSchema = z.enum(['found in text', 'from memory', 'rule evaluation']);

/** The register of comparisons with values from outside the engine. */
export const verificationResponse = z.object({
  engineVersion: z.string(),
  checks: z.array(
    z.object({
      id: z.string(),
      basis: z.string(),
      clause: z.string(),
      source: z.string(),
      evidence: evidenceSchema,
      inputs: z.string(),
      /** As printed, with the decimals of its source. */
      published: z.string(),
      ours: z.number(),
      unit: z.string(),
      difference: z.number(),
      tolerance: z.number(),
      agrees: z.boolean(),
      remarks: z.array(z.string()),
    }),
  ),
  disagreements: z.array(z.object({ id: z.string(), published: z.string(), reason: z.string() })),
  notYetAnswered: z.array(z.object({ id: z.string(), published: z.string(), reason: z.string() })),
});
export type Verification = z.infer<typeof verificationResponse>;
export type VerificationCheck = Verification['checks'][number];
