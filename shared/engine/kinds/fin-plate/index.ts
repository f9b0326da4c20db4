import type { DetailKind } from '../../types.ts';
import { prepareWith } from '../prepare.ts';
import { FinPlateDetail } from './detail.ts';
import { limitStates } from './limits.ts';
import { buildModel } from './model.ts';
import { notes } from './notes.ts';
import { parameters } from './parameters.ts';
import { rules } from './rule-list.ts';

/** A plate welded to the face of a support and bolted to the web of a beam: a simple connection for shear and pull. */
export const finPlate: DetailKind = {
  id: 'fin-plate',
  title: 'Fin plate',
  description:
    'A single plate fillet-welded on both sides to the face of a support, bolted to one side of a beam’s web in one or two columns; the beam bears on it at 90° either way and pulls at 0°.',
  angleRange: { minimum: -90, maximum: 90 },
  senses: ['tension'],
  parameters,
  limitStates: limitStates.map(({ id, code, title, part }) => ({ id, code, title, part })),
  rules,
  notes,
  prepare: prepareWith(parameters, (values, basis) => new FinPlateDetail(buildModel(values, basis))),
};
