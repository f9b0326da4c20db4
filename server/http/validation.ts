import type { z } from 'zod';
import type { Fault } from '@shared/contracts/common.ts';
import { problem } from './problems.ts';
import { sentence } from './validation-sentences.ts';

/** Never sent back, however wrong. */
const secretFields = new Set(['password', 'current', 'next']);
const longestValue = 100;

const fieldOf = (path: readonly PropertyKey[]): string => path.map(String).join('.') || 'body';

function small(value: unknown): boolean {
  const text = JSON.stringify(value) as string | undefined;
  return text !== undefined && text.length <= longestValue;
}

function fault(field: string, message: string, value: unknown): Fault {
  const secret = secretFields.has(field.split('.').at(-1) ?? '');
  return { field, message, ...(!secret && small(value) ? { value } : {}) };
}

function faultsOf(issue: z.core.$ZodIssue): Fault[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => {
      const field = fieldOf([...issue.path, key]);
      return fault(field, `${field} is not a field that can be given here.`, undefined);
    });
  }
  return [fault(fieldOf(issue.path), issue.message, issue.input)];
}

/** Every fault of an input, or its parsed value. */
export function check<S extends z.ZodType>(
  schema: S,
  input: unknown,
): { ok: true; value: z.output<S> } | { ok: false; faults: Fault[] } {
  const result = schema.safeParse(input, { reportInput: true, error: sentence });
  if (result.success) return { ok: true, value: result.data };
  return { ok: false, faults: result.error.issues.flatMap(faultsOf) };
}

/**
 * The parsed parts of a request.
 * @throws {ProblemError} validation, with the faults of all parts together
 */
export function checkAll<T extends Record<string, [z.ZodType, unknown]>>(
  parts: T,
): { [K in keyof T]: z.output<T[K][0]> } {
  const faults: Fault[] = [];
  const values: Record<string, unknown> = {};
  for (const [name, [schema, input]] of Object.entries(parts)) {
    const checked = check(schema, input);
    if (checked.ok) values[name] = checked.value;
    else faults.push(...checked.faults);
  }
  if (faults.length > 0) problem('validation', { errors: faults });
  return values as { [K in keyof T]: z.output<T[K][0]> };
}
