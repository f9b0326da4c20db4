import type { AngleGrid, Definition, ParameterSetting } from '@shared/contracts/definition.ts';
import { findKind } from '@shared/engine/index.ts';
import { anglesOf, valuesOf } from '@shared/engine/sweep/index.ts';
import { count, upTo } from '../../composables/format.ts';
import { unitAfter, valueTitle } from '../../composables/value-title.ts';

export interface DefinitionLine {
  readonly name: string;
  readonly label: string;
  readonly symbol: string;
  readonly unit: string;
  readonly text: string;
  /** How many values it takes: 1 for a fixed one, 0 for one that is derived from others. */
  readonly values: number;
}

const number = (value: number) => upTo(value, 3);
const range = ({ from, to, step }: { from: number; to: number; step: number }) =>
  `${number(from)} to ${number(to)} in steps of ${number(step)}`;

function textOf(kind: string, name: string, setting: ParameterSetting): string {
  if (setting.mode === 'range') return range(setting);
  if (setting.mode === 'derived') return `= ${setting.expression}`;
  return valuesOf(setting)
    .map((value) => valueTitle(kind, name, value))
    .join(', ');
}

/** Every parameter that the definition gives, in the order of the kind's schema. */
export function definitionLines({
  kind,
  parameters,
}: Pick<Definition, 'kind' | 'parameters'>): DefinitionLine[] {
  const specs = findKind(kind)?.parameters ?? [];
  const known = specs.filter(({ name }) => parameters[name] !== undefined);
  const order = [...known.map(({ name }) => name), ...Object.keys(parameters)];
  return [...new Set(order)].flatMap((name) => {
    const setting = parameters[name];
    if (!setting) return [];
    const { label = name, symbol = '', unit = '' } = specs.find((spec) => spec.name === name) ?? {};
    const values = valuesOf(setting);
    return [
      {
        name,
        label,
        symbol,
        unit: values.length === 1 ? unitAfter(kind, name, values[0], unit) : unit,
        text: textOf(kind, name, setting),
        values: values.length,
      },
    ];
  });
}

/** The load angles in words, e.g. "-60 to 60 in steps of 5 (25 angles)". */
export function anglesText(angles: AngleGrid): string {
  const words = angles.mode === 'range' ? range(angles) : angles.values.map(number).join(', ');
  const many = anglesOf(angles).length;
  return `${words} (${count(many)} ${many === 1 ? 'angle' : 'angles'})`;
}
