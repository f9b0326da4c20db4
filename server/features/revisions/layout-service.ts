import type { Definition } from '@shared/contracts/definition.ts';
import { LIMITS } from '@shared/contracts/definition.ts';
import type { Fault } from '@shared/contracts/common.ts';
import { bases, findBasis, findKind, kinds, type BasisInfo, type DetailKind } from '@shared/engine/index.ts';
import { expandGrid, valuesOf, type SweepDefinition, type SweepGrid } from '@shared/engine/sweep/index.ts';
import { problem } from '../../http/problems.ts';
import { engineCatalogue } from '../catalogue/service.ts';

/** A definition with what it stands for. */
export interface Layout {
  readonly definition: Definition & SweepDefinition;
  readonly kind: DetailKind;
  readonly basis: BasisInfo;
  readonly grid: SweepGrid;
}

/** Single precision cannot tell smaller steps of a large capacity apart. */
const leastIncrement = 0.1;

const fault = (field: string, value: unknown, message: string): Fault => ({
  field: `definition.${field}`,
  message,
  ...(value === undefined ? {} : { value }),
});

const accepted = (ids: readonly { readonly id: string }[]): string => ids.map(({ id }) => id).join(', ');

/** Where a value of a setting was written. */
function placeOf(setting: Definition['parameters'][string], index: number): string {
  if (setting.mode === 'fixed') return 'value';
  if (setting.mode === 'list') return `values.${index}`;
  return index === 0 ? 'from' : 'to';
}

/** Every single value against the kind's schema; the first fault of a range is enough. */
function faultsOfValues(definition: Definition & SweepDefinition, kind: DetailKind): Fault[] {
  return Object.entries(definition.parameters).flatMap(([name, setting]) => {
    const values = valuesOf(setting);
    if (values.length > LIMITS.values) {
      const message = `${values.length} values; at most ${LIMITS.values}. Sweep fewer.`;
      return [fault(`parameters.${name}`, values.length, message)];
    }
    const faults = values.flatMap((value, index) => {
      const prepared = kind.prepare({ [name]: value }, definition.basis, engineCatalogue, definition.factors);
      const own = prepared.ok ? [] : prepared.faults.filter(({ field }) => field === name);
      return own.map((one) =>
        fault(`parameters.${name}.${placeOf(setting, index)}`, value, `${one.message}.`),
      );
    });
    return setting.mode === 'range' ? faults.slice(0, 1) : faults;
  });
}

/**
 * A definition laid out, or all its faults with their paths. Never expands what is too large.
 */
export function layOut(given: Definition): { ok: true; layout: Layout } | { ok: false; faults: Fault[] } {
  const definition = given as Definition & SweepDefinition;
  const kind = findKind(given.kind);
  const basis = findBasis(given.basis);
  const faults: Fault[] = [];
  if (!kind) faults.push(fault('kind', given.kind, `There is no such kind; there are ${accepted(kinds)}.`));
  if (!basis) {
    faults.push(fault('basis', given.basis, `There is no such design basis; there are ${accepted(bases)}.`));
  }
  if (given.increment < leastIncrement) {
    const message = `Capacities are rounded down to steps of at least ${leastIncrement} kN, not ${given.increment}.`;
    faults.push(fault('increment', given.increment, message));
  }
  if (!kind || !basis) return { ok: false, faults };
  const laid = expandGrid(definition, kind, LIMITS);
  if (!laid.ok) faults.push(...laid.faults.map(({ field, value, message }) => fault(field, value, message)));
  if (laid.ok) faults.push(...faultsOfValues(definition, kind));
  if (!laid.ok || faults.length > 0) return { ok: false, faults };
  return { ok: true, layout: { definition, kind, basis, grid: laid.grid } };
}

/**
 * Lays out what somebody wants to save.
 * @throws {ProblemError} validation, with every fault
 */
export function layOutOrRefuse(definition: Definition): Layout {
  const result = layOut(definition);
  if (!result.ok) return problem('validation', { errors: result.faults });
  return result.layout;
}

/** Lays out what was stored: it passed every check when it was saved. */
export function layOutStored(definition: string): Layout {
  const result = layOut(JSON.parse(definition) as Definition);
  if (!result.ok) throw new Error(`A stored definition is at fault: ${JSON.stringify(result.faults[0])}`);
  return result.layout;
}
