import {
  catalogueNames,
  catalogueNumbersOf,
  type DetailKind,
  type EngineCatalogue,
  type ParameterSpec,
} from '../engine/index.ts';
import { isNumeric } from '../engine/sweep/index.ts';
import type { Scope } from './check.ts';
import type { NameInfo } from './types.ts';

/**
 * Every name that an expression of a kind may use: its parameters, and the numbers that catalogue choices bring.
 * @param catalogue null while it is not loaded: then catalogue names are not checked
 */
export function scopeOf(kind: DetailKind, catalogue: EngineCatalogue | null): Scope {
  const parameters = kind.parameters.map((spec): NameInfo => {
    const { name, label, unit } = spec;
    if (isNumeric(spec)) return { name, type: 'number', label, unit };
    const words = wordsOf(spec, catalogue);
    return { name, type: 'word', label, unit, ...(words === undefined ? {} : { words }) };
  });
  const numbers = catalogueNumbersOf(kind).map(({ name, label, unit }): NameInfo => ({
    name,
    type: 'number',
    label,
    unit,
  }));
  return new Map([...parameters, ...numbers].map((info) => [info.name, info]));
}

function wordsOf(spec: ParameterSpec, catalogue: EngineCatalogue | null): readonly string[] | undefined {
  const choices = (spec.choices ?? []).map(({ value }) => value);
  if (spec.type === 'choice') return choices;
  return catalogue ? [...choices, ...catalogueNames(spec, catalogue)] : undefined;
}
