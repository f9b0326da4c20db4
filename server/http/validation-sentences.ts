import type { z } from 'zod';

type RawIssue = z.core.$ZodRawIssue;

const kinds: Record<string, string> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  object: 'an object',
  record: 'an object',
  array: 'a list',
};
const formats: Record<string, string> = {
  email: 'an e-mail address such as name@firm.example',
  url: 'an address such as https://firm.example',
  datetime: 'a time such as 2026-01-31T12:00:00Z',
};
const longestShown = 60;

/** The given value as a person may read it; long ones are cut. */
function shown(value: unknown): string {
  if (typeof value === 'number') return String(value);
  if (Array.isArray(value)) return `a list of ${value.length}`;
  if (value !== null && typeof value === 'object') return 'an object';
  const text = JSON.stringify(value) as string | undefined;
  if (text === undefined) return typeof value;
  return text.length > longestShown ? `${text.slice(0, longestShown)}…"` : text;
}

const secret = /(^|\.)(password|current|next)$/;

function typeSentence(field: string, expected: string, input: unknown): string {
  const kind = kinds[expected] ?? expected;
  if (input === undefined) return `${field} is missing; it must be ${kind}.`;
  if (secret.test(field)) return `${field} must be ${kind}.`;
  return `${field} must be ${kind}, not ${shown(input)}.`;
}

function sizeSentence(field: string, issue: RawIssue, limit: 'least' | 'most', input: unknown): string {
  const bound = String(limit === 'least' ? issue.minimum : issue.maximum);
  const origin = String(issue.origin);
  if (origin === 'string') {
    return `${field} must have at ${limit} ${bound} characters; it has ${String(input).length}.`;
  }
  if (origin === 'array' || origin === 'set') {
    return `${field} must have at ${limit} ${bound} entries; it has ${(input as unknown[]).length}.`;
  }
  const exclusive = limit === 'least' ? 'more than' : 'less than';
  return `${field} must be ${issue.inclusive === false ? exclusive : `at ${limit}`} ${bound}, not ${shown(input)}.`;
}

/** What each form of a union says against the value; the first reason of each is enough to see what is meant. */
function unionSentence(field: string, issue: RawIssue, input: unknown): string {
  const options = (issue.options as unknown[] | undefined)?.map(String) ?? [];
  if (options.length > 0) return `${field} must be one of ${options.join(', ')}, not ${shown(input)}.`;
  const errors = (issue.errors as { expected?: string }[][] | undefined) ?? [];
  const accepted = errors.flatMap(([first]) =>
    first?.expected ? [kinds[first.expected] ?? first.expected] : [],
  );
  const wanted = [...new Set(accepted)];
  if (wanted.length > 0) return `${field} must be ${wanted.join(' or ')}, not ${shown(input)}.`;
  return `${field} fits none of its accepted forms; it is ${shown(input)}.`;
}

/**
 * A fault in one plain sentence: field, given value, and what is accepted. Used for every schema that brings no
 * sentence of its own.
 */
export function sentence(issue: RawIssue): string {
  const field = (issue.path ?? []).map(String).join('.') || 'body';
  const input = issue.input;
  switch (issue.code) {
    case 'invalid_type':
      return typeSentence(field, String(issue.expected), input);
    case 'too_small':
      return sizeSentence(field, issue, 'least', input);
    case 'too_big':
      return sizeSentence(field, issue, 'most', input);
    case 'invalid_format':
      return `${field} must be ${formats[String(issue.format)] ?? 'in the accepted form'}, not ${shown(input)}.`;
    case 'invalid_value': {
      const values = (issue.values as unknown[]).map(String).join(', ');
      if (input === undefined) return `${field} is missing; it must be one of ${values}.`;
      return `${field} must be one of ${values}, not ${shown(input)}.`;
    }
    case 'not_multiple_of':
      return `${field} must be a multiple of ${String(issue.divisor)}, not ${shown(input)}.`;
    case 'invalid_union':
      return unionSentence(field, issue, input);
    case 'invalid_key':
      return `${field} is a name that cannot be given here.`;
    default:
      return `${field} is not accepted as ${shown(input)}.`;
  }
}
