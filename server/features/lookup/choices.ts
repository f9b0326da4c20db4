import type { Fault } from '@shared/contracts/common.ts';
import type { ParameterValue } from '@shared/engine/index.ts';
import { ordinalOf } from '@shared/engine/sweep/index.ts';
import { problem } from '../../http/problems.ts';
import { nameParameter, sameValue, type SweptRevision, valueText } from '../results/service.ts';

type Choices = Readonly<Record<string, ParameterValue>>;

/**
 * The variant that some choices stand for: exactly one of its own values for every swept parameter.
 * @throws {ProblemError} validation, each fault under `choices.<name>` with what is accepted
 */
export function ordinalOfChoices(swept: SweptRevision, choices: Choices): number {
  const { axes } = swept;
  const faults: Fault[] = Object.keys(choices)
    .filter((name) => !axes.some((axis) => axis.name === name))
    .map((name) => {
      const swept = axes.map((axis) => axis.name).join(', ') || 'nothing';
      return { field: `choices.${name}`, message: `It is not chosen here; this revision asks for ${swept}.` };
    });
  const indices = axes.map(({ name, values }) => {
    const given = Object.hasOwn(choices, name) ? choices[name] : undefined;
    const index = given === undefined ? -1 : values.findIndex((value) => sameValue(value, given));
    if (index < 0) {
      const { label, unit } = nameParameter(swept, name);
      const accepted = `${values.map(valueText).join(', ')}${unit && ` ${unit}`}`;
      const message = `${label} must be one of ${accepted}.`;
      faults.push({ field: `choices.${name}`, message, ...(given === undefined ? {} : { value: given }) });
    }
    return index;
  });
  if (faults.length > 0) problem('validation', { errors: faults });
  return ordinalOf(axes, indices);
}
