import { LIMITS, type FamilyRule, type ParameterSetting } from '@shared/contracts/definition.ts';
import { findBasis } from '@shared/engine/index.ts';
import { hasExpressions, type SweepDefinition, type VariantFormulas } from '@shared/engine/sweep/index.ts';
import type { BasisId, DetailKind, EngineCatalogue } from '@shared/engine/types.ts';
import { formulaReader } from '@shared/expressions/index.ts';
import type { RuleDraft } from './draft.ts';
import type { FieldFault } from './read-numbers.ts';

/** Reads the rules, each with its number; a row that is not complete is a fault, never left out in silence. */
export function readRules(rows: readonly RuleDraft[], faults: FieldFault[]): FamilyRule[] {
  if (rows.length > LIMITS.rules) {
    const message = `A family may have at most ${LIMITS.rules} rules; ${rows.length} were given.`;
    faults.push({ field: 'rules', message });
  }
  rows.forEach(({ expression, message }, index) => {
    const field = `rules.${index}`;
    if (expression.trim() === '')
      faults.push({
        field: `${field}.expression`,
        message: `Rule ${index + 1} needs a comparison, e.g. pitch >= 2.5 * bolt_d.`,
      });
    if (message.trim().length < 3 || message.trim().length > 160)
      faults.push({
        field: `${field}.message`,
        message: `Rule ${index + 1} needs a message of 3 to 160 characters, shown where it does not hold.`,
      });
  });
  return rows.map(({ expression, message }) => ({ expression, message: message.trim() }));
}

export interface Expressions {
  readonly kind: DetailKind;
  readonly basis: string;
  readonly settings: Readonly<Record<string, ParameterSetting>>;
  readonly rules: readonly FamilyRule[];
  readonly catalogue: EngineCatalogue | null;
}

/** Reads every expression by the path that the server and the sweep use; faults are at the fields of the form. */
export function readExpressions(
  { kind, basis, settings, rules, catalogue }: Expressions,
  faults: FieldFault[],
): VariantFormulas | null {
  const definition = {
    kind: kind.id,
    basis: basis as BasisId,
    parameters: settings,
    // A row without an expression is told of already; the others keep their numbers.
    rules: rules.map((rule) => (rule.expression.trim() === '' ? { ...rule, expression: '1 = 1' } : rule)),
    angles: { mode: 'list', values: [0] },
    senses: ['tension'],
    increment: 1,
    factors: findBasis(basis)?.defaultFactors ?? { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
  } satisfies SweepDefinition;
  if (!catalogue || !hasExpressions(definition)) return null;
  const read = formulaReader(catalogue)(definition, kind);
  if (read.ok) return read.formulas;
  for (const { field, message, place } of read.faults)
    faults.push({ field: field.replace(/^parameters\./, ''), message, ...(place ? { place } : {}) });
  return null;
}
