import { findKind, kinds } from '@shared/engine/index.ts';

/**
 * A parameter's value as a person reads it: the label of a choice, the numbers of a value given by numbers.
 * @param kind where it is known; otherwise the first kind that has such a parameter names the choice
 */
export function valueTitle(kind: string | null, parameter: string, value: unknown): string {
  const schema = (kind === null ? kinds : [findKind(kind)]).flatMap((one) => one?.parameters ?? []);
  const choice = schema
    .filter(({ name }) => name === parameter)
    .flatMap(({ choices }) => choices ?? [])
    .find((one) => one.value === value);
  if (choice) return choice.label;
  if (typeof value === 'object' && value !== null)
    return Object.entries(value)
      .map(([name, part]) => `${name} ${String(part)}`)
      .join(', ');
  return String(value).replace(/^-/, '−');
}
