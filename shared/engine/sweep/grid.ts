import type { DetailKind, FieldFault, ParameterSpec, ParameterValue, ParameterValues } from '../types.ts';
import { countOfRange, valuesOfRange } from './range.ts';
import type {
  AngleSetting,
  FormulaReader,
  GridResult,
  Setting,
  SweepDefinition,
  SweepLimits,
  SweptAxis,
  VariantFormulas,
} from './types.ts';

/**
 * Lays a definition out as a grid, or says every fault with its path (`parameters.pitch.step`). A grid that is
 * too large is counted and refused, never expanded.
 * @param readFormulas reads the expressions of a definition that has any
 */
export function expandGrid(
  definition: SweepDefinition,
  kind: DetailKind,
  limits: SweepLimits,
  readFormulas: FormulaReader,
): GridResult {
  const faults: FieldFault[] = [];
  faultsOfSettings(definition, kind, faults);
  const formulas = formulasOf(definition, kind, readFormulas, faults);
  faultsOfAngles(definition, kind, limits, faults);
  if (faults.length === 0) faultsOfSize(definition, limits, faults);
  if (faults.length > 0) return { ok: false, faults };
  const axes: SweptAxis[] = [];
  const fixed: Record<string, ParameterValue> = {};
  for (const { name } of kind.parameters) {
    const setting = definition.parameters[name];
    if (setting === undefined || setting.mode === 'derived') continue;
    if (setting.mode === 'fixed') fixed[name] = setting.value;
    else axes.push({ name, values: valuesOf(setting) });
  }
  const { angles, senses } = { angles: anglesOf(definition.angles), senses: definition.senses };
  const variantCount = axes.reduce((product, { values }) => product * values.length, 1);
  const cellCount = variantCount * angles.length * senses.length;
  return { ok: true, grid: { axes, fixed, variantCount, cellCount, angles, senses, formulas } };
}

function formulasOf(
  definition: SweepDefinition,
  kind: DetailKind,
  readFormulas: FormulaReader,
  faults: FieldFault[],
): VariantFormulas | null {
  if (!hasExpressions(definition)) return null;
  const read = readFormulas(definition, kind);
  if (read.ok) return read.formulas;
  faults.push(...read.faults);
  return null;
}

/** Whether a definition derives a parameter or has a rule. */
export function hasExpressions({ parameters, rules = [] }: SweepDefinition): boolean {
  return rules.length > 0 || Object.values(parameters).some(({ mode }) => mode === 'derived');
}

/** The fixed and swept values of one variant, by its place in the grid; derived ones are not among them. */
export function variantValues(
  grid: { readonly axes: readonly SweptAxis[]; readonly fixed: ParameterValues },
  ordinal: number,
): ParameterValues {
  const values: Record<string, ParameterValue> = { ...grid.fixed };
  let rest = ordinal;
  for (const { name, values: choices } of [...grid.axes].reverse()) {
    values[name] = choices[rest % choices.length]!;
    rest = Math.floor(rest / choices.length);
  }
  return values;
}

/** The place in the grid of a choice of one value an axis: indices in the order of the axes. */
export function ordinalOf(axes: readonly SweptAxis[], indices: readonly number[]): number {
  return axes.reduce((ordinal, { values }, axis) => ordinal * values.length + (indices[axis] ?? 0), 0);
}

/** Every value that a setting stands for; none where it is derived. */
export function valuesOf(setting: Setting): readonly ParameterValue[] {
  if (setting.mode === 'derived') return [];
  if (setting.mode === 'fixed') return [setting.value];
  return setting.mode === 'list' ? setting.values : valuesOfRange(setting.from, setting.to, setting.step);
}

/** Load angles in degrees. */
export function anglesOf(setting: AngleSetting): readonly number[] {
  return setting.mode === 'list' ? setting.values : valuesOfRange(setting.from, setting.to, setting.step);
}

function countOf(setting: Setting | AngleSetting): number {
  if (setting.mode === 'fixed' || setting.mode === 'derived') return 1;
  if (setting.mode === 'list') return setting.values.length;
  return countOfRange(setting.from, setting.to, setting.step);
}

function faultsOfSettings(definition: SweepDefinition, kind: DetailKind, faults: FieldFault[]): void {
  const known = new Map(kind.parameters.map((spec) => [spec.name, spec]));
  for (const [name, setting] of Object.entries(definition.parameters)) {
    const field = `parameters.${name}`;
    const spec = known.get(name);
    if (spec === undefined) {
      faults.push({ field, value: name, message: `${kind.title} has no parameter named "${name}".` });
    } else if (setting.mode === 'range' || setting.mode === 'derived') {
      if (!isNumeric(spec)) {
        const what = setting.mode === 'range' ? 'from–to–step is' : 'expressions are';
        const message = `${spec.label} is chosen from a list; ${what} for numbers.`;
        faults.push({ field, value: setting.mode, message });
      }
      if (setting.mode === 'range') faultsOfRange(field, setting, faults);
    } else if (setting.mode === 'list') {
      faultsOfList(field, setting.values, faults);
    }
  }
}

/** Whether a parameter is a number, and so can count from–to–step or be derived. */
export const isNumeric = ({ type }: Pick<ParameterSpec, 'type'>): boolean =>
  type === 'length' || type === 'number' || type === 'count';

function faultsOfRange(
  field: string,
  range: { readonly from: number; readonly to: number; readonly step: number },
  faults: FieldFault[],
): void {
  const { from, to, step } = range;
  if (!(step > 0))
    faults.push({ field: `${field}.step`, value: step, message: `The step ${step} must be above 0.` });
  if (!(to >= from)) {
    faults.push({
      field: `${field}.to`,
      value: to,
      message: `The end ${to} must not be below the start ${from}.`,
    });
  }
}

function faultsOfList(field: string, values: readonly unknown[], faults: FieldFault[]): void {
  if (values.length === 0) faults.push({ field, value: '[]', message: 'The list needs at least one value.' });
  const seen = new Set<string>();
  values.forEach((value, index) => {
    const key = JSON.stringify(value);
    if (seen.has(key)) {
      faults.push({ field: `${field}.values.${index}`, value, message: `${key} stands in the list twice.` });
    }
    seen.add(key);
  });
}

function faultsOfAngles(
  { angles, senses }: SweepDefinition,
  kind: DetailKind,
  limits: SweepLimits,
  faults: FieldFault[],
): void {
  const count = countOf(angles);
  if (angles.mode === 'range') faultsOfRange('angles', angles, faults);
  else faultsOfList('angles', angles.values, faults);
  if (count > limits.angles) {
    faults.push({
      field: 'angles',
      value: count,
      message: `${count} load angles; at most ${limits.angles}.`,
    });
    return;
  }
  const { minimum, maximum } = kind.angleRange;
  const outside = anglesOf(angles).find((angle) => angle < minimum || angle > maximum);
  if (outside !== undefined) {
    const message = `Load angle ${outside}°: ${kind.title} covers ${minimum}° to ${maximum}°.`;
    faults.push({ field: 'angles', value: outside, message });
  }
  faultsOfList('senses', senses, faults);
}

function faultsOfSize(definition: SweepDefinition, limits: SweepLimits, faults: FieldFault[]): void {
  const variants = Object.values(definition.parameters).reduce(
    (product, setting) => product * countOf(setting),
    1,
  );
  const cells = variants * countOf(definition.angles) * definition.senses.length;
  const over = (what: string, count: number, limit: number) => {
    const message = `${count.toLocaleString('en')} ${what}; at most ${limit.toLocaleString('en')}. Sweep fewer values.`;
    faults.push({ field: 'parameters', value: count, message });
  };
  if (variants > limits.variants) over('variants', variants, limits.variants);
  else if (cells > limits.cells) over('cells', cells, limits.cells);
}
