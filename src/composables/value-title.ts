import { findKind } from '@shared/engine/index.ts';

/** A parameter's value as a person reads it: the label of a choice, the numbers of a value given by numbers. */
export function valueTitle(kind: string, parameter: string, value: unknown): string {
  const spec = findKind(kind)?.parameters.find(({ name }) => name === parameter);
  const choice = spec?.choices?.find((one) => one.value === value);
  if (choice) return choice.label;
  if (typeof value === 'object' && value !== null)
    return Object.entries(value)
      .map(([name, part]) => `${name} ${String(part)}`)
      .join(', ');
  return String(value).replace(/^-/, '−');
}
