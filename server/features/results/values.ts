import type { ParameterValue } from '@shared/engine/index.ts';

/** A value in a sentence or a cell: `12`, `M20`, `fy 350, fu 480`. */
export function valueText(value: ParameterValue): string {
  if (typeof value !== 'object') return String(value);
  return Object.entries(value)
    .map(([name, part]) => `${name} ${part}`)
    .join(', ');
}

/** Whether two values of a parameter are the same, whatever the order of their members. */
export function sameValue(one: unknown, other: unknown): boolean {
  if (typeof one !== 'object' || typeof other !== 'object' || !one || !other) return one === other;
  const entries = Object.entries(one);
  const others = new Map<string, unknown>(Object.entries(other));
  return entries.length === others.size && entries.every(([name, part]) => others.get(name) === part);
}
