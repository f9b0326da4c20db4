import type { DetailKind } from '../../types.ts';
import { prepareWith } from '../prepare.ts';
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
  prepare: prepareWith(parameters, (values, basis) => new GussetDetail(buildModel(values, basis))),
};
