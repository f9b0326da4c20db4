import type { DetailKind } from '../../types.ts';
import { prepareWith } from '../prepare.ts';
import { EndPlateDetail } from './detail.ts';
import { limitStates } from './limits.ts';
import { buildModel } from './model.ts';
import { notes } from './notes.ts';
import { parameters } from './parameters.ts';
import { rules } from './rule-list.ts';

/** A plate welded to the end of a beam and bolted to its support: a simple connection for shear and pull. */
export const endPlate: DetailKind = {
  id: 'end-plate',
  title: 'End plate',
  description:
    'A plate fillet-welded to the web at the end of a beam, partial depth or flush, bolted to the support with a column of bolts on each side of the web; the beam bears at 90° either way and pulls at 0°.',
  angleRange: { minimum: -90, maximum: 90 },
  senses: ['tension'],
  parameters,
  limitStates: limitStates.map(({ id, code, title, part }) => ({ id, code, title, part })),
  rules,
  notes,
  prepare: prepareWith(parameters, (values, basis) => new EndPlateDetail(buildModel(values, basis))),
};
