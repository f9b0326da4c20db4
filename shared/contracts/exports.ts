import { z } from 'zod';
import { idSchema, instantSchema, personRefSchema } from './common.ts';
import { parameterValueSchema, senseSchema } from './definition.ts';

/** The axes that a table can be laid out over: swept parameters, or the load angle. */
export const ANGLE_AXIS = 'angle';

/** A drafter's table: what goes down, what goes across; every other swept parameter makes a sheet or is held. */
export const exportRequest = z.strictObject({
  revisionId: idSchema,
  format: z.literal('xlsx'),
  down: z.array(z.string().max(40)).min(1).max(4),
  across: z.string().max(40),
  /** Held at one value; swept parameters named nowhere make one sheet a value. */
  held: z.record(z.string().max(40), parameterValueSchema).default({}),
  sense: senseSchema,
  drawingNumber: z.string().trim().max(40).default(''),
  paper: z.enum(['A4', 'A3']).default('A3'),
});
export type ExportRequest = z.infer<typeof exportRequest>;

export const exportRecord = z.object({
  id: idSchema,
  familyCode: z.string(),
  letter: z.string(),
  shortHash: z.string(),
  format: z.string(),
  drawingNumber: z.string(),
  person: personRefSchema,
  createdAt: instantSchema,
  fileHash: z.string(),
});
export const exportListResponse = z.object({ exports: z.array(exportRecord) });
