import type { BasisId, ParameterSpec } from '../../types.ts';

type Choice = readonly [value: string, label: string, help: string];

/** A choice of method; the first of its values is the default. */
export function method(
  name: string,
  label: string,
  help: string,
  choices: readonly [Choice, ...Choice[]],
  bases?: readonly BasisId[],
): ParameterSpec {
  return {
    name,
    label,
    symbol: '',
    group: 'method',
    type: 'choice',
    unit: '',
    choices: choices.map(([value, title, meaning]) => ({ value, label: title, help: meaning })),
    default: choices[0][0],
    ...(bases === undefined ? {} : { bases }),
    help,
  };
}
