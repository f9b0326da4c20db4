import {
  catalogueNumbersOf,
  catalogueReader,
  type DetailKind,
  type EngineCatalogue,
  type FieldFault,
  type ParameterSpec,
} from '../engine/index.ts';
import { type FormulaReader, isNumeric, type SweepDefinition } from '../engine/sweep/index.ts';
import type { Scope } from './check.ts';
import type { Slots } from './compile.ts';
import { type Expression, readExpression, slotsOf } from './expression.ts';
import { FamilyFormulas, type FamilyRule, type Step } from './family-formulas.ts';
import { orderOf } from './order.ts';
import { scopeOf } from './scope.ts';

/** The reader of a definition's expressions that the engine asks for: every fault with its field and place. */
export function formulaReader(catalogue: EngineCatalogue): FormulaReader {
  return (definition, kind) => {
    const scope = scopeOf(kind, catalogue, definition);
    const reader = new DefinitionReader(scope, slotsOf(scope));
    const derived = reader.derived(definition, kind);
    const rules = reader.rules(definition);
    const steps = reader.steps(derived, kind);
    const { faults } = reader;
    const read = catalogueReader(kind, definition.basis, catalogue, definition.factors);
    if (read === undefined) {
      faults.push({ field: 'basis', value: definition.basis, message: 'There is no such design basis.' });
    }
    if (faults.length > 0 || read === undefined) return { ok: false, faults };
    return { ok: true, formulas: new FamilyFormulas(kind, reader.slots, steps, rules, read) };
  };
}

type Derived = ReadonlyMap<string, { readonly spec: ParameterSpec; readonly expression: Expression }>;

class DefinitionReader {
  readonly faults: FieldFault[] = [];

  constructor(
    private readonly scope: Scope,
    readonly slots: Slots,
  ) {}

  derived({ parameters }: SweepDefinition, kind: DetailKind): Derived {
    const found = new Map<string, { spec: ParameterSpec; expression: Expression }>();
    for (const spec of kind.parameters) {
      const setting = Object.hasOwn(parameters, spec.name) ? parameters[spec.name] : undefined;
      if (setting?.mode !== 'derived' || !isNumeric(spec)) continue;
      const expression = this.read(`parameters.${spec.name}.expression`, setting.expression, 'number');
      if (expression !== undefined) found.set(spec.name, { spec, expression });
    }
    return found;
  }

  rules({ rules = [] }: SweepDefinition): readonly FamilyRule[] {
    return rules.flatMap(({ expression: text, message }, index) => {
      const expression = this.read(`rules.${index}.expression`, text, 'truth');
      return expression === undefined ? [] : [{ expression, message }];
    });
  }

  /** What is worked out for a variant, each after what it needs. */
  steps(derived: Derived, kind: DetailKind): readonly Step[] {
    const numbers = new Map(catalogueNumbersOf(kind).map((number) => [number.name, number]));
    const needs = new Map<string, readonly string[]>();
    for (const [name, { expression }] of derived) needs.set(name, expression.names);
    for (const [name, number] of numbers) needs.set(name, number.needs);
    const ordered = orderOf(needs);
    if (!ordered.ok) {
      const field = ordered.circle.find((name) => derived.has(name)) ?? '';
      const message = `Derived parameters need each other in a circle: ${ordered.circle.join(' → ')}. One of them must be fixed or swept.`;
      const value = derived.get(field)?.expression.text ?? '';
      this.faults.push({ field: `parameters.${field}.expression`, value, message });
      return [];
    }
    return ordered.order.map((name) => ({ name, ...derived.get(name) }));
  }

  private read(field: string, text: string, wanted: 'number' | 'truth'): Expression | undefined {
    const read = readExpression(text, this.scope, wanted, this.slots);
    if (read.ok) return read.expression;
    for (const { start, end, message } of read.faults) {
      const value = text.slice(start, Math.min(end, start + 40));
      const where = value === '' ? 'At the end' : `At character ${start + 1}, ${value}`;
      this.faults.push({ field, value, message: `${where}: ${message}`, place: { start, end } });
    }
    return undefined;
  }
}
