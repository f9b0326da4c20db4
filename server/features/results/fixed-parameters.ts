import type { ParameterSpec, ParameterValue } from '@shared/engine/index.ts';
import { expressionOf, type SweptRevision } from './swept-revision.ts';

interface NamedParameter {
  readonly name: string;
  readonly label: string;
  readonly symbol: string;
  readonly unit: string;
}
/** A parameter that is the same in every variant. */
export interface FixedParameter extends NamedParameter {
  readonly value: ParameterValue;
}
/** A parameter that follows from others. */
export interface DerivedParameter extends NamedParameter {
  readonly expression: string;
}

/** What every variant has in common: all parameters that are neither swept nor derived and count for at least one. */
export function fixedParametersOf(swept: SweptRevision): FixedParameter[] {
  return unsweptOf(swept)
    .filter(({ name }) => expressionOf(swept, name) === null)
    .map((spec) => ({ ...named(spec), value: swept.fixed[spec.name] ?? spec.default }));
}

/** The derived parameters that count for at least one variant. */
export function derivedParametersOf(swept: SweptRevision): DerivedParameter[] {
  return unsweptOf(swept).flatMap((spec) => {
    const expression = expressionOf(swept, spec.name);
    return expression === null ? [] : [{ ...named(spec), expression }];
  });
}

const named = ({ name, label, symbol, unit }: ParameterSpec): NamedParameter => ({
  name,
  label,
  symbol,
  unit,
});

function unsweptOf(swept: SweptRevision): readonly ParameterSpec[] {
  const { kind, basis, axes } = swept;
  return kind.parameters
    .filter(({ name }) => !axes.some((axis) => axis.name === name))
    .filter(({ bases }) => bases?.includes(basis.id) ?? true)
    .filter(({ when }) => !when || canBe(swept, when.parameter, when.is));
}

/** Whether a parameter has one of some values in any variant; of a derived one that is not known. */
function canBe(swept: SweptRevision, name: string, values: readonly string[]): boolean {
  if (expressionOf(swept, name) !== null) return true;
  const spec = swept.kind.parameters.find((one) => one.name === name);
  if (spec === undefined) return false;
  const axis = swept.axes.find((one) => one.name === name);
  const taken = axis?.values ?? [swept.fixed[name] ?? spec.default];
  return taken.some((value) => values.includes(String(value)));
}
