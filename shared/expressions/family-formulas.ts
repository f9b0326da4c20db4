import type {
  CatalogueReading,
  DetailKind,
  ParameterSpec,
  ParameterValue,
  ParameterValues,
  Rejection,
} from '../engine/index.ts';
import {
  type CompletedValues,
  DERIVED_VALUE,
  familyRuleId,
  isNumeric,
  type VariantFormulas,
} from '../engine/sweep/index.ts';
import { isEqual, tidy } from './arithmetic.ts';
import type { Evaluate, Failure, Frame, Slots } from './compile.ts';
import { type Expression, frameFor, valueIn } from './expression.ts';

/** Something that is worked out for a variant: a derived parameter, or a number that comes with a catalogue choice. */
export interface Step {
  readonly name: string;
  readonly spec?: ParameterSpec;
  readonly expression?: Expression;
}
export interface FamilyRule {
  readonly expression: Expression;
  readonly message: string;
}
type ReadNumber = (name: string, values: ParameterValues) => CatalogueReading;

/** The expressions of one definition, compiled and in order. Works out one variant at a time. */
export class FamilyFormulas implements VariantFormulas {
  private readonly frame: Frame;
  private readonly reasons = new Map<string, string>();
  private readonly steps: readonly Step[];
  private readonly inputs: readonly ParameterSpec[];

  constructor(
    kind: DetailKind,
    private readonly slots: Slots,
    steps: readonly Step[],
    private readonly rules: readonly FamilyRule[],
    private readonly read: ReadNumber,
  ) {
    this.frame = frameFor(slots);
    const used = new Set([...steps, ...rules].flatMap(({ expression }) => expression?.names ?? []));
    this.steps = steps.filter(({ name, expression }) => expression !== undefined || used.has(name));
    const derived = new Set(steps.filter(({ expression }) => expression).map(({ name }) => name));
    this.inputs = kind.parameters.filter(({ name }) => used.has(name) && !derived.has(name));
  }

  complete(given: ParameterValues): CompletedValues {
    const values: Record<string, ParameterValue> = { ...given };
    this.fill(given);
    for (const { name, spec, expression } of this.steps) {
      if (spec === undefined || expression === undefined) {
        this.readNumber(name, values);
        continue;
      }
      const derived = this.derive(spec, expression);
      if (typeof derived !== 'number') return { complete: false, values, rejections: [derived] };
      this.frame.numbers[this.slot(name)] = derived;
      values[name] = derived;
    }
    const rejections = this.rules.flatMap((rule, index) => this.ask(rule, index));
    return { complete: true, values, rejections };
  }

  /** Lays the fixed and swept values that expressions use into the frame. */
  private fill(given: ParameterValues): void {
    for (const spec of this.inputs) {
      const value = (Object.hasOwn(given, spec.name) ? given[spec.name] : undefined) ?? spec.default;
      const slot = this.slot(spec.name);
      if (!isNumeric(spec)) this.frame.words[-1 - slot] = wordOf(value);
      else this.frame.numbers[slot] = typeof value === 'number' ? value : NaN;
    }
  }

  private readNumber(name: string, values: ParameterValues): void {
    const reading = this.read(name, values);
    this.frame.numbers[this.slot(name)] = reading.value ?? NaN;
    if (reading.value === null) this.reasons.set(name, reading.reason);
  }

  private derive(spec: ParameterSpec, { text, evaluate }: Expression): number | Rejection {
    const said = `${spec.label} = ${text}`;
    const outcome = valueIn(evaluate, this.frame);
    if (!outcome.ok) return unusable(`${said} has no value: ${this.reasonOf(outcome.failure, text)}`, 0, 0);
    const value = tidy(outcome.value);
    const { minimum = -Infinity, maximum = Infinity, unit } = spec;
    const given = `${said} gives ${shown(value)}${unit && ` ${unit}`}`;
    if (spec.type === 'count' && !isEqual(value, Math.round(value)))
      return unusable(`${given}; a whole number is accepted`, value, Math.round(value));
    if (value < minimum) return unusable(`${given}; at least ${minimum} is accepted`, value, minimum);
    if (value > maximum) return unusable(`${given}; at most ${maximum} is accepted`, value, maximum);
    return spec.type === 'count' ? Math.round(value) : value;
  }

  /** A rule without a value does not hold: the variant is rejected, never let through. */
  private ask({ expression, message }: FamilyRule, index: number): Rejection[] {
    const { text, evaluate } = expression;
    const outcome = valueIn(evaluate, this.frame);
    if (outcome.ok && outcome.value !== 0) return [];
    const rule = familyRuleId(index);
    const clause = `Rule ${index + 1} of this family`;
    const broken = { rule, title: message, clause, unit: '' };
    if (!outcome.ok) {
      const reason = `${text} has no value: ${this.reasonOf(outcome.failure, text)}.`;
      return [{ ...broken, message: reason, value: 0, limit: 1 }];
    }
    const [value, limit] = expression.sides?.map((side) => this.sideOf(side)) ?? [];
    if (value === undefined || limit === undefined)
      return [{ ...broken, message: `${text} does not hold.`, value: 0, limit: 1 }];
    const numbers = `${shown(value)} against ${shown(limit)}`;
    return [{ ...broken, message: `${text} does not hold: ${numbers}.`, value, limit }];
  }

  private sideOf(side: Evaluate): number | undefined {
    const outcome = valueIn(side, this.frame);
    return outcome.ok ? outcome.value : undefined;
  }

  private reasonOf({ start, end, reason, name }: Failure, text: string): string {
    const why = name === undefined ? undefined : this.reasons.get(name);
    return why ?? `${reason} in ${text.slice(start, end)}`;
  }

  private slot(name: string): number {
    const slot = this.slots.get(name);
    if (slot === undefined) throw new Error(`No place for ${name}`);
    return slot;
  }
}

const unusable = (message: string, value: number, limit: number): Rejection => ({
  rule: DERIVED_VALUE,
  title: 'Derived parameter without a usable value',
  clause: 'Definition of this family',
  message: `${message}.`,
  value,
  limit,
  unit: '',
});

/** A catalogue value by numbers goes by its own name. */
function wordOf(value: ParameterValue): string {
  if (typeof value !== 'object') return String(value);
  return typeof value['name'] === 'string' ? value['name'] : 'by numbers';
}

/** Six figures tell an engineer enough, and no floating-point noise. */
const shown = (value: number): string => String(Number(value.toPrecision(6)));
