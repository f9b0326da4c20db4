import { createHash } from 'node:crypto';
import type { Fault } from '@shared/contracts/common.ts';
import { LIMITS, type Definition } from '@shared/contracts/definition.ts';
import { findBasis, findKind, type DetailKind, type ParameterValue } from '@shared/engine/index.ts';
import {
  expandGrid,
  type FormulaReader,
  hasExpressions,
  valuesOf,
  type SweepDefinition,
  type SweepGrid,
  type VariantFormulas,
} from '@shared/engine/sweep/index.ts';
import { formulaReader } from '@shared/expressions/index.ts';
import { canonicalJson } from '../../canonical-json.ts';
import { engineCatalogue } from '../../catalogue.ts';
import { problem } from '../../http/problems.ts';

/** A definition that can be swept, laid out. */
export interface CheckedDefinition {
  readonly definition: SweepDefinition;
  readonly kind: DetailKind;
  readonly grid: SweepGrid;
  /** Canonical JSON, and SHA-256 over it. */
  readonly text: string;
  readonly hash: string;
}

/** Values of one parameter that are tried before a long list is taken on trust of its first faults. */
const MOST_FAULTS = 50;

/**
 * Checks a definition against its kind, basis and the catalogue.
 * @throws {ProblemError} validation, with every fault under `definition.`
 */
export function checkDefinition(definition: Definition): CheckedDefinition {
  const kind = findKind(definition.kind);
  if (!kind) return refuse([unknown('definition.kind', 'kind of detail', definition.kind)]);
  if (!findBasis(definition.basis))
    return refuse([unknown('definition.basis', 'design basis', definition.basis)]);
  const sweep = withoutEmptyRules(definition) as SweepDefinition;
  const laidOut = expandGrid(sweep, kind, LIMITS, readFormulas);
  if (!laidOut.ok)
    return refuse(laidOut.faults.map((fault) => ({ ...fault, field: `definition.${fault.field}` })));
  const faults = faultsOfValues(sweep, kind);
  if (faults.length > 0) return refuse(faults);
  const text = canonicalJson(sweep);
  return { definition: sweep, kind, grid: laidOut.grid, text, hash: sha256(text) };
}

/** A definition that was checked when it was saved, laid out again. */
export function layOut(text: string): CheckedDefinition {
  const definition = JSON.parse(text) as SweepDefinition;
  const kind = findKind(definition.kind);
  if (!kind) throw new Error(`No kind "${definition.kind}" in this program`);
  const laidOut = expandGrid(definition, kind, LIMITS, readFormulas);
  if (!laidOut.ok) throw new Error(`A stored definition is at fault: ${laidOut.faults[0]?.message}`);
  return { definition, kind, grid: laidOut.grid, text, hash: sha256(text) };
}

/**
 * What a stored definition's expressions say of its variants; null where it has none.
 * @throws {Error} when this program cannot read them
 */
export function formulasOf(definition: SweepDefinition, kind: DetailKind): VariantFormulas | null {
  if (!hasExpressions(definition)) return null;
  const read = readFormulas(definition, kind);
  if (!read.ok) throw new Error(`A stored expression is at fault: ${read.faults[0]?.message}`);
  return read.formulas;
}

const readFormulas: FormulaReader = (definition, kind) => formulaReader(engineCatalogue())(definition, kind);

/** No rules and an empty list of them are the same definition, and must have the same hash. */
function withoutEmptyRules({ rules, ...rest }: Definition): Definition {
  return rules?.length ? { ...rest, rules } : rest;
}

export const sha256 = (text: string | Buffer): string => createHash('sha256').update(text).digest('hex');

function refuse(errors: readonly Fault[]): never {
  return problem('validation', { errors });
}

const unknown = (field: string, what: string, value: string): Fault => ({
  field,
  value,
  message: `There is no ${what} "${value}".`,
});

/** Tries each value of each parameter with the engine's own checks, the others at their defaults. */
function faultsOfValues(definition: SweepDefinition, kind: DetailKind): Fault[] {
  const faults: Fault[] = [];
  const names = new Set(kind.parameters.map(({ name }) => name));
  for (const [name, setting] of Object.entries(definition.parameters)) {
    valuesOf(setting).forEach((value, index) => {
      if (faults.length >= MOST_FAULTS) return;
      const place = setting.mode === 'list' ? `.values.${index}` : '';
      faults.push(...faultsOfValue(definition, kind, name, value, place, names));
    });
  }
  const factors = kind.prepare({}, definition.basis, engineCatalogue(), definition.factors);
  if (!factors.ok)
    faults.push(...factors.faults.map((fault) => ({ ...fault, field: `definition.${fault.field}` })));
  return faults;
}

function faultsOfValue(
  definition: SweepDefinition,
  kind: DetailKind,
  name: string,
  value: ParameterValue,
  place: string,
  names: ReadonlySet<string>,
): Fault[] {
  const prepared = kind.prepare({ [name]: value }, definition.basis, engineCatalogue());
  if (prepared.ok) return [];
  const own = prepared.faults.filter(({ field }) => names.has(field.split('.')[0] ?? ''));
  return own.map((fault) => ({ ...fault, field: `definition.parameters.${fault.field}${place}` }));
}
