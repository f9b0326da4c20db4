import { z } from 'zod';
import { definitionSchema } from './definition.ts';

/** Version of the file; a newer one is refused by name. */
export const FAMILY_FILE_VERSION = 1;

/** A family's definition as a file: to keep beside a project, or to carry to another catalogue. */
export const familyFileSchema = z.strictObject({
  file: z.literal('backmark-family'),
  version: z.literal(FAMILY_FILE_VERSION),
  code: z.string().max(20),
  title: z.string().max(120),
  definition: definitionSchema,
});
export type FamilyFile = z.infer<typeof familyFileSchema>;

export type FamilyFileResult =
  | { readonly ok: true; readonly file: FamilyFile }
  | { readonly ok: false; readonly faults: readonly { readonly field: string; readonly message: string }[] };

const fault = (field: string, message: string): FamilyFileResult => ({
  ok: false,
  faults: [{ field, message }],
});

/** Reads such a file. Every fault is named with its field; nothing is taken of a file that has one. */
export function readFamilyFile(text: string): FamilyFileResult {
  let given: unknown;
  try {
    given = JSON.parse(text);
  } catch (error) {
    return fault('file', `It is not JSON: ${(error as Error).message}`);
  }
  if (typeof given !== 'object' || given === null || (given as { file?: unknown }).file !== 'backmark-family')
    return fault('file', 'It is not a family definition: "file" must be "backmark-family".');
  const { version } = given as { version?: unknown };
  if (typeof version === 'number' && version > FAMILY_FILE_VERSION)
    return fault(
      'version',
      `It has version ${version}, made by a newer Backmark; this one reads version ${FAMILY_FILE_VERSION}.`,
    );
  const parsed = familyFileSchema.safeParse(given);
  if (parsed.success) return { ok: true, file: parsed.data };
  const faults = parsed.error.issues.map(({ path, message }) => ({
    field: path.join('.') || 'file',
    message,
  }));
  return { ok: false, faults };
}

/** Writes it, readable by a person. */
export const writeFamilyFile = (family: Omit<FamilyFile, 'file' | 'version'>): string =>
  `${JSON.stringify({ file: 'backmark-family', version: FAMILY_FILE_VERSION, ...family }, null, 2)}\n`;
