import { createBasis } from '../../standards/registry.ts';
import type { DetailKind } from '../../types.ts';
import { basisFaults } from '../basis-faults.ts';
import { validateFactors, validateParameters } from '../validate.ts';
import { GussetDetail } from './detail.ts';
import { limitStates } from './limits.ts';
import { buildModel } from './model.ts';
import { notes } from './notes.ts';
import { parameters } from './parameters.ts';
import { rules } from './rule-list.ts';

/** A plate welded to the face of a support, with a bolted brace that pulls or pushes at an angle. */
export const gussetPlate: DetailKind = {
  id: 'gusset-plate',
  title: 'Gusset plate',
  description:
    'A plate fillet-welded on both sides to the face of a support along its full height; a bolted brace of angles or a flat pulls or pushes on it at an angle.',
  angleRange: { minimum: -80, maximum: 80 },
  senses: ['tension', 'compression'],
  parameters,
  limitStates: limitStates.map(({ id, code, title, part }) => ({ id, code, title, part })),
  rules,
  notes,
  prepare(values, basisId, catalogue, factors) {
    const checked = validateParameters(parameters, values, catalogue);
    const faults = [...(checked.ok ? [] : checked.faults), ...validateFactors(factors)];
    const basis = createBasis(basisId, factors);
    if (basis === undefined) {
      faults.push({
        field: 'basis',
        value: String(basisId).slice(0, 60),
        message: 'There is no such design basis',
      });
    }
    if (checked.ok && basis !== undefined) faults.push(...basisFaults(checked.values, basis));
    if (!checked.ok || basis === undefined || faults.length > 0) return { ok: false, faults };
    return { ok: true, detail: new GussetDetail(buildModel(checked.values, basis)) };
  },
};
