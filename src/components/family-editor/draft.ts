import type { AngleGrid, Definition, ParameterSetting } from '@shared/contracts/definition.ts';
import { isNumeric } from '@shared/engine/sweep/index.ts';
import type {
  DetailKind,
  ParameterSpec,
  ParameterValue,
  PartialFactors,
  Sense,
} from '@shared/engine/types.ts';

export type Mode = ParameterSetting['mode'];

/** What stands in the fields of a range, as it was typed. */
export interface RangeText {
  from: string;
  to: string;
  step: string;
}

/** Everything that was typed for one parameter, in every mode, so that changing the mode loses nothing. */
export interface ParameterDraft {
  mode: Mode;
  /** A number as typed, or what was picked. */
  fixed: ParameterValue;
  list: ParameterValue[];
  range: RangeText;
  expression: string;
}

export interface RuleDraft {
  expression: string;
  message: string;
}

export interface AnglesDraft {
  mode: AngleGrid['mode'];
  list: string[];
  range: RangeText;
}

export interface FamilyDraft {
  code: string;
  title: string;
  kind: string;
  basis: string;
  parameters: Record<string, ParameterDraft>;
  rules: RuleDraft[];
  angles: AnglesDraft;
  senses: Sense[];
  increment: number;
  factors: Record<keyof PartialFactors, string>;
}

const asText = (spec: ParameterSpec, value: ParameterValue): ParameterValue =>
  isNumeric(spec) && typeof value === 'number' ? String(value) : value;

const rangeText = (given?: { from: number; to: number; step: number }): RangeText =>
  given
    ? { from: String(given.from), to: String(given.to), step: String(given.step) }
    : { from: '', to: '', step: '' };

function parameterDraft(spec: ParameterSpec, setting?: ParameterSetting): ParameterDraft {
  const draft: ParameterDraft = {
    mode: setting?.mode ?? 'fixed',
    fixed: asText(spec, spec.default),
    list: [],
    range: rangeText(),
    expression: '',
  };
  if (setting?.mode === 'fixed') draft.fixed = asText(spec, setting.value);
  if (setting?.mode === 'list') draft.list = setting.values.map((value) => asText(spec, value));
  if (setting?.mode === 'range') draft.range = rangeText(setting);
  if (setting?.mode === 'derived') draft.expression = setting.expression;
  return draft;
}

const anglesDraft = (grid: AngleGrid): AnglesDraft => ({
  mode: grid.mode,
  list: grid.mode === 'list' ? grid.values.map(String) : [],
  range: rangeText(grid.mode === 'range' ? grid : { from: -80, to: 80, step: 5 }),
});

/** A stored definition, laid into the fields of the form. */
export function draftOf(
  definition: Definition,
  kind: DetailKind,
  names: { code: string; title: string },
): FamilyDraft {
  const { gammaM0, gammaM1, gammaM2 } = definition.factors;
  return {
    code: names.code,
    title: names.title,
    kind: definition.kind,
    basis: definition.basis,
    parameters: Object.fromEntries(
      kind.parameters.map((spec) => [spec.name, parameterDraft(spec, definition.parameters[spec.name])]),
    ),
    rules: (definition.rules ?? []).map(({ expression, message }) => ({ expression, message })),
    angles: anglesDraft(definition.angles),
    senses: [...definition.senses],
    increment: definition.increment,
    factors: { gammaM0: String(gammaM0), gammaM1: String(gammaM1), gammaM2: String(gammaM2) },
  };
}

/** A new family: every parameter fixed at its default, angles over the whole range of the kind. */
export function newDraft(
  kind: DetailKind,
  basis: string,
  settings: { increment: number; factors: PartialFactors },
): FamilyDraft {
  const { minimum: from, maximum: to } = kind.angleRange;
  const definition: Definition = {
    schema: 1,
    kind: kind.id,
    basis,
    parameters: {},
    angles: { mode: 'range', from, to, step: 5 },
    senses: [...kind.senses],
    increment: settings.increment,
    factors: { ...settings.factors },
  };
  return draftOf(definition, kind, { code: '', title: '' });
}
