import {
  LIMITS,
  type AngleGrid,
  type Definition,
  type ParameterSetting,
} from '@shared/contracts/definition.ts';
import { findBasis } from '@shared/engine/index.ts';
import type { DetailKind, EngineCatalogue, ParameterSpec, ParameterValue } from '@shared/engine/types.ts';
import { isNumeric, type VariantFormulas } from '@shared/engine/sweep/index.ts';
import type { FamilyDraft, ParameterDraft } from './draft.ts';
import { readExpressions, readRules } from './read-expressions.ts';
import { readList, readNumber, readRange, type FieldFault, type NumberRule } from './read-numbers.ts';

export type { FieldFault } from './read-numbers.ts';

/** The values that a parameter may take, as far as they are known; for conditions on other parameters. */
const possible = (draft: ParameterDraft | undefined): string[] => {
  if (!draft) return [];
  if (draft.mode === 'list') return draft.list.map(String);
  if (draft.mode === 'fixed') return [String(draft.fixed)];
  if (draft.mode === 'derived') return [];
  const [from, to] = [Number(draft.range.from), Number(draft.range.to)];
  return from <= to && to - from < 100
    ? Array.from({ length: to - from + 1 }, (_, at) => String(from + at))
    : [];
};

/** Whether the detail uses a parameter under this basis and with these other parameters. */
export function isUsed(spec: ParameterSpec, draft: Pick<FamilyDraft, 'basis' | 'parameters'>): boolean {
  if (spec.bases && !spec.bases.some((id) => id === draft.basis)) return false;
  const { when } = spec;
  const condition = when && draft.parameters[when.parameter];
  // What a derived one comes to is known variant by variant only.
  if (!when || condition?.mode === 'derived') return true;
  return possible(condition).some((value) => when.is.includes(value));
}

const ruleOf = (spec: ParameterSpec): NumberRule => ({
  label: spec.label,
  unit: spec.unit,
  minimum: spec.minimum ?? -1e9,
  maximum: spec.maximum ?? 1e9,
  whole: spec.type === 'count',
});

function readNumeric(
  spec: ParameterSpec,
  draft: ParameterDraft,
  faults: FieldFault[],
): ParameterSetting | null {
  const rule = ruleOf(spec);
  if (draft.mode === 'fixed') {
    const value = readNumber(rule, String(draft.fixed), spec.name, faults);
    return value === null ? null : { mode: 'fixed', value };
  }
  if (draft.mode === 'list') {
    const values = readList(rule, draft.list.map(String), spec.name, LIMITS.values, faults);
    return values && { mode: 'list', values };
  }
  if (draft.mode === 'derived') return readDerived(spec, draft, faults);
  const range = readRange(rule, draft.range, spec.name, LIMITS.values, faults);
  return range && { mode: 'range', ...range };
}

function readDerived(
  { name, label }: ParameterSpec,
  { expression }: ParameterDraft,
  faults: FieldFault[],
): ParameterSetting | null {
  const text = expression.trim() === '' ? '' : expression;
  if (text !== '') return { mode: 'derived', expression: text };
  faults.push({ field: `${name}.expression`, message: `${label} needs an expression, e.g. 2 * bolt_d.` });
  return null;
}

const copy = (value: ParameterValue) => (typeof value === 'object' ? { ...value } : value);

function readPicked(
  spec: ParameterSpec,
  draft: ParameterDraft,
  faults: FieldFault[],
): ParameterSetting | null {
  if (draft.mode === 'list') {
    if (draft.list.length) return { mode: 'list', values: draft.list.map(copy) };
    faults.push({ field: spec.name, message: `${spec.label} needs at least one value.` });
    return null;
  }
  if (draft.fixed !== '' && draft.fixed !== null) return { mode: 'fixed', value: copy(draft.fixed) };
  faults.push({ field: spec.name, message: `${spec.label} is not chosen yet.` });
  return null;
}

/** One parameter's setting, or null with its faults added. */
export const readSetting = (spec: ParameterSpec, draft: ParameterDraft, faults: FieldFault[]) =>
  isNumeric(spec) ? readNumeric(spec, draft, faults) : readPicked(spec, draft, faults);

function readAngles({ angles }: FamilyDraft, kind: DetailKind, faults: FieldFault[]): AngleGrid | null {
  const rule = { label: 'Load angle', unit: '°', whole: false, ...kind.angleRange };
  if (angles.mode === 'list') {
    const values = readList(rule, angles.list, 'angles', LIMITS.angles, faults);
    return values && { mode: 'list', values };
  }
  const range = readRange(rule, angles.range, 'angles', LIMITS.angles, faults, 0.25);
  return range && { mode: 'range', ...range };
}

function readFactors(draft: FamilyDraft, faults: FieldFault[]): Definition['factors'] | null {
  const basis = findBasis(draft.basis);
  if (!basis?.hasPartialFactors) return basis ? { ...basis.defaultFactors } : null;
  const read = (name: keyof FamilyDraft['factors'], label: string, minimum: number) =>
    readNumber(
      { label, unit: '', minimum, maximum: 2, whole: false },
      draft.factors[name],
      `factors.${name}`,
      faults,
    );
  const gammaM0 = read('gammaM0', 'γ M0', 0.9);
  const gammaM1 = read('gammaM1', 'γ M1', 0.9);
  const gammaM2 = read('gammaM2', 'γ M2', 1);
  return gammaM0 === null || gammaM1 === null || gammaM2 === null ? null : { gammaM0, gammaM1, gammaM2 };
}

export interface ReadDraft {
  /** Null while anything is faulty. */
  readonly definition: Definition | null;
  /** Those that could be read; the preview and the count use them. */
  readonly settings: Readonly<Record<string, ParameterSetting>>;
  readonly angles: AngleGrid | null;
  /** What the expressions say of a variant; null where there are none, or while one is faulty. */
  readonly formulas: VariantFormulas | null;
  readonly faults: readonly FieldFault[];
}

/**
 * Reads the whole form; parameters that the detail does not use are left out.
 * @param catalogue null while it is not loaded: until then expressions are not read
 */
export function readDraft(
  draft: FamilyDraft,
  kind: DetailKind,
  catalogue: EngineCatalogue | null = null,
): ReadDraft {
  const faults: FieldFault[] = [];
  const settings: Record<string, ParameterSetting> = {};
  for (const spec of kind.parameters) {
    const typed = draft.parameters[spec.name];
    if (!typed || !isUsed(spec, draft)) continue;
    const setting = readSetting(spec, typed, faults);
    if (setting) settings[spec.name] = setting;
  }
  const angles = readAngles(draft, kind, faults);
  const factors = readFactors(draft, faults);
  if (draft.senses.length === 0)
    faults.push({ field: 'senses', message: 'Choose tension, compression or both.' });
  const { basis, increment, senses } = draft;
  const rules = readRules(draft.rules, faults);
  const formulas = readExpressions({ kind, basis, settings, rules, catalogue }, faults);
  const definition =
    faults.length || !angles || !factors
      ? null
      : {
          schema: 1 as const,
          kind: kind.id,
          basis,
          parameters: settings,
          ...(rules.length > 0 ? { rules } : {}),
          angles,
          senses: [...senses],
          increment,
          factors,
        };
  return { definition, settings, angles, formulas, faults };
}
