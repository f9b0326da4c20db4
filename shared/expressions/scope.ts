import {
  catalogueNames,
  catalogueNumbersOf,
  type DetailKind,
  type EngineCatalogue,
  findBasis,
  type ParameterSpec,
} from '../engine/index.ts';
import { isNumeric, type SweepDefinition, valuesOf } from '../engine/sweep/index.ts';
import type { Scope } from './check.ts';
import type { NameInfo } from './types.ts';

/** What a definition says of which parameters have an effect. */
export type Chosen = Pick<SweepDefinition, 'basis' | 'parameters'>;

/**
 * Every name that an expression of a kind may use: its parameters, and the numbers that catalogue choices bring. A
 * parameter that the detail does not use is refused with the reason, for nobody could check its value on a sheet.
 */
export function scopeOf(kind: DetailKind, catalogue: EngineCatalogue, chosen: Chosen): Scope {
  const parameters = kind.parameters.map((spec): NameInfo => {
    const { name, label, unit } = spec;
    const unused = unusedBecause(spec, kind, chosen);
    const info = { name, label, unit, ...(unused === undefined ? {} : { unused }) };
    if (isNumeric(spec)) return { ...info, type: 'number' };
    const choices = (spec.choices ?? []).map(({ value }) => value);
    return { ...info, type: 'word', words: [...choices, ...catalogueNames(spec, catalogue)] };
  });
  const numbers = catalogueNumbersOf(kind).map(({ name, label, unit }): NameInfo => ({
    name,
    type: 'number',
    label,
    unit,
  }));
  return new Map([...parameters, ...numbers].map((info) => [info.name, info]));
}

function unusedBecause(spec: ParameterSpec, kind: DetailKind, chosen: Chosen): string | undefined {
  const { label, bases, when } = spec;
  if (bases !== undefined && !bases.includes(chosen.basis))
    return `${label} has no effect in ${findBasis(chosen.basis)?.short ?? chosen.basis}.`;
  const condition = kind.parameters.find(({ name }) => name === when?.parameter);
  if (when === undefined || condition === undefined) return undefined;
  const setting = Object.hasOwn(chosen.parameters, condition.name)
    ? chosen.parameters[condition.name]
    : undefined;
  if (setting?.mode === 'derived') return undefined;
  const values = setting === undefined ? [condition.default] : valuesOf(setting);
  if (values.some((value) => when.is.includes(String(value)))) return undefined;
  return `${label} has no effect unless ${condition.label} is ${when.is.join(' or ')}.`;
}
