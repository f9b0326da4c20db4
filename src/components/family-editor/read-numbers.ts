import { countOfRange } from '@shared/engine/sweep/index.ts';
import { numberOf } from '../../composables/number-text.ts';
import type { RangeText } from './draft.ts';

/** What a number of one field must be. */
export interface NumberRule {
  readonly label: string;
  readonly unit: string;
  readonly minimum: number;
  readonly maximum: number;
  readonly whole: boolean;
}

/** A fault, at the field by its path. */
export interface FieldFault {
  readonly field: string;
  readonly message: string;
  /** In an expression: places of the first character at fault and after the last. */
  readonly place?: { readonly start: number; readonly end: number };
}

const quoted = (text: string) => (text.trim() === '' ? 'nothing' : `“${text.slice(0, 40)}”`);

function accepted({ unit, minimum, maximum, whole }: NumberRule): string {
  const noun = whole ? 'a whole number' : 'a number';
  return `${noun} from ${minimum} to ${maximum}${unit && ` ${unit}`}`;
}

/** Reads one number; the fault names the field, what was given and what is accepted. */
export function readNumber(
  rule: NumberRule,
  text: string,
  field: string,
  faults: FieldFault[],
): number | null {
  const value = numberOf(text);
  const fits =
    value !== undefined &&
    value >= rule.minimum &&
    value <= rule.maximum &&
    (!rule.whole || Number.isInteger(value));
  if (fits) return value;
  faults.push({ field, message: `${rule.label} must be ${accepted(rule)}; ${quoted(text)} was given.` });
  return null;
}

export function readList(
  rule: NumberRule,
  texts: readonly string[],
  field: string,
  most: number,
  faults: FieldFault[],
): number[] | null {
  const own: FieldFault[] = [];
  const values = texts.map((text) => readNumber(rule, text, field, own));
  if (texts.length === 0) own.push({ field, message: `${rule.label} needs at least one value.` });
  if (texts.length > most)
    own.push({
      field,
      message: `${rule.label} may have at most ${most} values; ${texts.length} were given.`,
    });
  const twice = values.find((value, at) => value !== null && values.indexOf(value) !== at);
  if (twice !== undefined && twice !== null)
    own.push({ field, message: `${rule.label} has ${twice} twice.` });
  faults.push(...own);
  return own.length ? null : values.filter((value) => value !== null);
}

export function readRange(
  rule: NumberRule,
  text: RangeText,
  field: string,
  most: number,
  faults: FieldFault[],
  leastStep = 1e-6,
): { from: number; to: number; step: number } | null {
  const before = faults.length;
  const part = (name: string) => ({ ...rule, label: `${rule.label}, ${name},` });
  const from = readNumber(part('from'), text.from, `${field}.from`, faults);
  const to = readNumber(part('to'), text.to, `${field}.to`, faults);
  const least = rule.whole ? 1 : leastStep;
  const stepRule = { ...part('step'), minimum: least, maximum: Math.max(rule.maximum - rule.minimum, least) };
  const step = readNumber(stepRule, text.step, `${field}.step`, faults);
  if (from === null || to === null || step === null) return null;
  if (to < from)
    faults.push({
      field: `${field}.to`,
      message: `${rule.label}, to, must not be below from, ${from}; ${to} was given.`,
    });
  else if (countOfRange(from, to, step) > most)
    faults.push({
      field: `${field}.step`,
      message: `${rule.label} may have at most ${most} values; a step of ${step} gives ${countOfRange(from, to, step)}.`,
    });
  return faults.length > before ? null : { from, to, step };
}
