import type { DetailKind } from '../../types.ts';
import type { BoltPrefix } from '../parts.ts';
import { prepareWith } from '../prepare.ts';
import type { Resolved } from '../resolved.ts';
import { AngleCleatsDetail } from './detail.ts';
import { limitStates } from './limit-list.ts';
import { buildModel } from './model.ts';
import { notes } from './notes.ts';
import { parameters } from './parameters.ts';
import { rules } from './rule-list.ts';

const boltsUsed = (values: Resolved): readonly BoltPrefix[] =>
  values.choice('support_connection') === 'bolted_own' ? ['', 'support_'] : [''];

/** One or two angles on the web of a beam, fixed to the face of a support: a simple connection for shear and pull. */
export const angleCleats: DetailKind = {
  id: 'angle-cleats',
  title: 'Angle cleats',
  description:
    'Two angles, or a single one, bolted to the web of a beam and bolted or welded to the face of a support; the beam bears on them at 90° either way and pulls at 0°.',
  angleRange: { minimum: -90, maximum: 90 },
  senses: ['tension'],
  parameters,
  limitStates: limitStates.map(({ id, code, title, part }) => ({ id, code, title, part })),
  rules,
  notes,
  prepare: prepareWith(
    parameters,
    (values, basis) => new AngleCleatsDetail(buildModel(values, basis)),
    boltsUsed,
  ),
};
