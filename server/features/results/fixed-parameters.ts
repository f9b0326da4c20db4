import type { ParameterValue } from '@shared/engine/index.ts';
import type { SweptRevision } from './swept-revision.ts';

/** A parameter that is the same in every variant. */
export interface FixedParameter {
  readonly name: string;
  readonly label: string;
  readonly symbol: string;
  readonly unit: string;
  readonly value: ParameterValue;
}

/** What every variant has in common: all parameters that are not swept and count for at least one variant. */
export function fixedParametersOf({ kind, basis, axes, fixed }: SweptRevision): FixedParameter[] {
  const taken = new Map(
    kind.parameters.map((spec) => {
      const axis = axes.find(({ name }) => name === spec.name);
      return [spec.name, axis ? axis.values : [fixed[spec.name] ?? spec.default]] as const;
    }),
  );
  return kind.parameters
    .filter(
      ({ name, bases }) => !axes.some((axis) => axis.name === name) && (bases?.includes(basis.id) ?? true),
    )
    .filter(
      ({ when }) => !when || taken.get(when.parameter)?.some((value) => when.is.includes(String(value))),
    )
    .map(({ name, label, symbol, unit, default: fallback }) => ({
      name,
      label,
      symbol,
      unit,
      value: taken.get(name)?.[0] ?? fallback,
    }));
}
