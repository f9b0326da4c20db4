import { findKind, kinds } from '@shared/engine/index.ts';
import type { ParameterSpec } from '@shared/engine/types.ts';

function specsOf(kind: string | null, parameter: string): ParameterSpec[] {
  const schema = (kind === null ? kinds : [findKind(kind)]).flatMap((one) => one?.parameters ?? []);
  return schema.filter(({ name }) => name === parameter);
}

/** What 0 stands for in a parameter where it is no size, e.g. the normal hole. */
const zeroOf = (specs: readonly ParameterSpec[], value: unknown) =>
  value === 0 ? specs.find(({ zero }) => zero !== undefined)?.zero : undefined;

/**
 * A parameter's value as a person reads it: the label of a choice, the numbers of a value given by numbers.
 * @param kind where it is known; otherwise the first kind that has such a parameter names the choice
 */
export function valueTitle(kind: string | null, parameter: string, value: unknown): string {
  const specs = specsOf(kind, parameter);
  const choice = specs.flatMap(({ choices }) => choices ?? []).find((one) => one.value === value);
  if (choice) return choice.label;
  if (typeof value === 'object' && value !== null)
    return Object.entries(value)
      .map(([name, part]) => `${name} ${String(part)}`)
      .join(', ');
  return zeroOf(specs, value) ?? String(value).replace(/^-/, '−');
}

/** The unit that follows the value; none after words that stand for 0. */
export function unitAfter(kind: string | null, parameter: string, value: unknown, unit: string): string {
  return zeroOf(specsOf(kind, parameter), value) === undefined ? unit : '';
}
