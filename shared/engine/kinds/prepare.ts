import type { Basis } from '../standards/basis.ts';
import { createBasis } from '../standards/registry.ts';
import type { DetailKind, ParameterSpec, PreparedDetail } from '../types.ts';
import { basisFaults } from './basis-faults.ts';
import type { BoltPrefix } from './parts.ts';
import type { Resolved } from './resolved.ts';
import { validateFactors, validateParameters } from './validate.ts';

/**
 * The `prepare` of a kind: values, factors and basis are checked against its schema, every fault is reported, and
 * only what passed is built.
 * @param bolts the bolts that a detail uses, by the prefix of their parameters; absent: its only one
 */
export function prepareWith(
  parameters: readonly ParameterSpec[],
  build: (values: Resolved, basis: Basis) => PreparedDetail,
  bolts: (values: Resolved) => readonly BoltPrefix[] = () => [''],
): DetailKind['prepare'] {
  return (values, basisId, catalogue, factors) => {
    const checked = validateParameters(parameters, values, catalogue);
    const faults = [...(checked.ok ? [] : checked.faults), ...validateFactors(factors)];
    const basis = createBasis(basisId, factors);
    if (basis === undefined) {
      const message = 'There is no such design basis';
      faults.push({ field: 'basis', value: String(basisId).slice(0, 60), message });
    }
    if (checked.ok && basis !== undefined) {
      for (const prefix of bolts(checked.values)) faults.push(...basisFaults(checked.values, basis, prefix));
    }
    if (!checked.ok || basis === undefined || faults.length > 0) return { ok: false, faults };
    return { ok: true, detail: build(checked.values, basis) };
  };
}
